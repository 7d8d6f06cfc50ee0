import type { FrameFacts, PresentShock } from '../facts.js';
import { resolveSize, type SizeResult } from './resolve-size.js';

/** Which family of sizes the present shock belongs to, by its own mounts or by those of the frame it sits in. */
export function mountFamily(
  frame: FrameFacts,
  { bodyEndKind, shaftEndKind }: PresentShock,
): 'eyelet' | 'trunnion' | null {
  const ends = frame.entries.flatMap((entry) => [entry.frameEnd, entry.linkEnd]);
  if (bodyEndKind === 'trunnion' || shaftEndKind === 'trunnion') return 'trunnion';
  if (bodyEndKind !== null && shaftEndKind !== null) return 'eyelet';
  if (ends.some((end) => end?.mount.kind === 'trunnion')) return 'trunnion';
  return ends.length > 0 && ends.every((end) => end !== null) ? 'eyelet' : null;
}

/** The size of the present shock as far as it bears on this frame. */
export function presentSize(frame: FrameFacts, present: PresentShock): SizeResult {
  const published = frame.origin === 'sheet' ? frame.entries.flatMap((entry) => entry.sizeKey ?? []) : null;
  return resolveSize(present, published, mountFamily(frame, present));
}
