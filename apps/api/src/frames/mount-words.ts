import type { FrameEnd, FrameMount, ShockMount } from '@linkfell/fit-engine';

const figure = (value: number | null): string => (value === null ? '?' : String(value));

/** One end of a frame in a few words, such as "hardware 30x8 mm, on a yoke". */
export function frameEndWords(end: FrameEnd | null): string {
  if (!end) return 'not known';
  return mountWords(end.mount) + (end.yoke ? ', on a yoke' : '');
}

function mountWords(mount: FrameMount): string {
  switch (mount.kind) {
    case 'hardware':
      return `hardware ${figure(mount.widthMm)}x${figure(mount.boltMm)} mm`;
    case 'pin':
      return `pin ${figure(mount.diameterMm)} mm, ${figure(mount.widthMm)} mm wide`;
    case 'bearing-bolt':
      return `bolt for a bearing eye, ${figure(mount.boltMm)} mm, ${figure(mount.widthMm)} mm wide`;
    case 'trunnion':
      return 'trunnion';
  }
}

/** The kind of mount as one word for a narrow column. */
export function mountWord(kind: FrameMount['kind'] | ShockMount['kind']): string {
  const words = {
    hardware: 'hardware',
    pin: 'pin',
    'bearing-bolt': 'bearing bolt',
    trunnion: 'trunnion',
    eyelet: 'eyelet',
    'bearing-eye': 'bearing eye',
  } as const;
  return words[kind];
}
