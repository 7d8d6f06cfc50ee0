import type { FrameEnd, HardwareSeen, KitOnSale, ShockMount } from '../facts.js';

/** What one end needs between frame and eyelet. */
export type EndHardware =
  | { kind: 'nothing' }
  | { kind: 'reuse' }
  | { kind: 'kit'; kit: KitOnSale; confirmAtFitting: boolean }
  | { kind: 'several'; kits: readonly KitOnSale[] }
  | { kind: 'none-on-sale'; widthMm: number; boltMm: number }
  | { kind: 'not-measured' };

const same = (a: number, b: number, within = 0.01): boolean => Math.abs(a - b) <= within + 1e-9;
const known = (value: number | null): value is number => value !== null && Number.isFinite(value);

/** What two careful readings of the same hardware may differ by: width, bolt, bore, mm (common practice). */
const seenWithinMm = { width: 0.5, bolt: 0.3, bore: 0.1 };

/**
 * Hardware for one end. The sheet's figures are nominals and matched exactly; a rider's reading proposes the kits
 * within two uncertainties. Mounts that take no hardware need nothing; whether they agree is another check.
 */
export function endHardware(
  end: FrameEnd | null,
  shock: ShockMount,
  old: HardwareSeen | null,
  kits: readonly KitOnSale[],
): EndHardware {
  if (!end) return { kind: 'not-measured' };
  const { mount, uncertaintyMm: u } = end;
  if (mount.kind !== 'hardware' || shock.kind !== 'eyelet') return { kind: 'nothing' };
  const { widthMm, boltMm } = mount;
  if (!known(widthMm) || !known(boltMm) || !known(u) || u < 0 || !known(shock.boreMm)) {
    return { kind: 'not-measured' };
  }
  if (old && movesAcross(old, shock.boreMm, widthMm, boltMm, u)) return { kind: 'reuse' };
  const near = u === 0 ? 0.01 : 2 * u;
  const fitting = kits
    .filter(
      (kit) =>
        same(kit.boreMm, shock.boreMm) && same(kit.widthMm, widthMm, near) && same(kit.boltMm, boltMm, near),
    )
    .sort((a, b) => (a.id < b.id ? -1 : 1));
  const [kit] = fitting;
  if (!kit) return { kind: 'none-on-sale', widthMm, boltMm };
  // The same size from several makers is one size: any of them will do.
  const sizesFound = new Set(fitting.map(({ widthMm: w, boltMm: b }) => `${w}x${b}`));
  if (sizesFound.size > 1) return { kind: 'several', kits: fitting };
  return { kind: 'kit', kit, confirmAtFitting: u > 0 };
}

/** Old hardware goes into the new eye when it is sound, of the same bore and of the frame's size. */
const movesAcross = (
  { sound, boreMm, widthMm: seenWidth, boltMm: seenBolt }: HardwareSeen,
  eyeBoreMm: number,
  widthMm: number,
  boltMm: number,
  u: number,
): boolean =>
  sound === true &&
  known(boreMm) &&
  same(boreMm, eyeBoreMm, seenWithinMm.bore) &&
  same(seenWidth, widthMm, Math.max(seenWithinMm.width, 2 * u)) &&
  same(seenBolt, boltMm, Math.max(seenWithinMm.bolt, 2 * u));
