import type { FrameEnd, HardwareSeen, KitOnSale, ShockMount } from '../facts.js';

/** What one end needs between frame and eyelet. */
export type EndHardware =
  | { kind: 'nothing' }
  | { kind: 'reuse' }
  | { kind: 'kit'; kit: KitOnSale; confirmAtFitting: boolean }
  | { kind: 'several'; kits: readonly KitOnSale[] }
  | { kind: 'none-on-sale'; widthMm: number; boltMm: number }
  | { kind: 'not-measured' };

const same = (a: number, b: number, within = 0.01): boolean => Math.abs(a - b) <= within;

/** Half a millimetre is what two careful caliper readings of the same hardware may differ by. */
const seenWithinMm = 0.5;

/**
 * Hardware for one end. The sheet's figures are nominals and matched exactly; a rider's reading proposes the kits
 * within two uncertainties.
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
  if (widthMm === null || boltMm === null) return { kind: 'not-measured' };
  const goes =
    old?.sound === true &&
    old.boreMm !== null &&
    same(old.boreMm, shock.boreMm, 0.1) &&
    same(old.widthMm, widthMm, Math.max(seenWithinMm, 2 * u)) &&
    same(old.boltMm, boltMm, 0.3);
  if (goes) return { kind: 'reuse' };
  const near = u === 0 ? 0.01 : 2 * u;
  const fitting = kits.filter(
    (kit) =>
      same(kit.boreMm, shock.boreMm, 0.1) &&
      same(kit.widthMm, widthMm, near) &&
      same(kit.boltMm, boltMm, near),
  );
  const [kit] = fitting;
  if (!kit) return { kind: 'none-on-sale', widthMm, boltMm };
  // The same size from several makers is one size: any of them will do.
  const sizesFound = new Set(fitting.map(({ widthMm: w, boltMm: b }) => `${w}x${b}`));
  if (sizesFound.size > 1) return { kind: 'several', kits: fitting };
  return { kind: 'kit', kit, confirmAtFitting: u > 0 };
}
