import type { FitQuestion, FrameEnd, FrameMount, ShockMount } from '../../src/facts.js';
import { sizes } from '../../src/sizing/sizes.js';
import { fact } from './questions.js';
import type { Random } from './seeded.js';

/** One hard figure of a question set to another nominal value; null where the question has none to change. */
export type Change = (q: FitQuestion, r: Random) => FitQuestion | null;

const other = <T>(r: Random, from: readonly T[], than: T): T => r.pick(from.filter((one) => one !== than));
const entryOf = ({ frame }: FitQuestion) => (frame.entries.length === 1 ? frame.entries[0] : undefined);

const withShock = (q: FitQuestion, over: Partial<FitQuestion['shock']>): FitQuestion => ({
  ...q,
  shock: { ...q.shock, ...over },
});
const withFrame = (q: FitQuestion, over: Partial<FitQuestion['frame']>): FitQuestion => ({
  ...q,
  frame: { ...q.frame, ...over },
});

/** Another nominal for the end of a shock; bores and bolts as the trade has them. */
function otherEye(eye: ShockMount, r: Random): ShockMount {
  const kinds: ShockMount[] = [
    { kind: 'eyelet', boreMm: 15 },
    { kind: 'bearing-eye', boltMm: 8, widthMm: 30 },
    { kind: 'trunnion' },
  ];
  if (eye.kind === 'bearing-eye' && r.chance(0.6)) {
    return r.chance(0.5)
      ? { ...eye, boltMm: other(r, [6, 8, 10, 12], eye.boltMm) }
      : { ...eye, widthMm: other(r, [19, 22, 24, 28, 30, 40], eye.widthMm) };
  }
  return r.pick(kinds.filter(({ kind }) => kind !== eye.kind));
}

function otherMount(mount: FrameMount, r: Random): FrameMount | null {
  switch (mount.kind) {
    case 'pin':
      return mount.diameterMm === null
        ? null
        : { ...mount, diameterMm: other(r, [10, 12, 12.7, 14, 15, 16], mount.diameterMm) };
    case 'bearing-bolt':
      if (mount.boltMm === null || mount.widthMm === null) return null;
      return r.chance(0.5)
        ? { ...mount, boltMm: other(r, [6, 8, 10, 12], mount.boltMm) }
        : { ...mount, widthMm: other(r, [19, 22, 24, 28, 30, 40], mount.widthMm) };
    case 'hardware':
      // A width that nobody sells; another that somebody sells is simply another kit.
      return { ...mount, widthMm: r.pick([19, 21, 36, 52, 70]) };
    case 'trunnion':
      return { kind: 'pin', diameterMm: 15, widthMm: 24 };
  }
}

/** A sheet's nominal; what a rider has read may be a neighbour within its doubt, and is confirmed at fitting. */
const nominal = (end: FrameEnd | null): end is FrameEnd => end !== null && end.uncertaintyMm === 0;

export const hardFigures: Readonly<Record<string, Change>> = {
  'size of the shock': (q, r) =>
    withShock(q, {
      sizeKey: other(
        r,
        sizes.map(({ key }) => key),
        q.shock.sizeKey,
      ),
      spacedToKeys: [],
    }),
  'size on the sheet': (q, r) => {
    const entry = entryOf(q);
    if (!entry?.sizeKey) return null;
    const free = sizes.map(({ key }) => key).filter((key) => !q.shock.spacedToKeys.includes(key));
    const sizeKey = r.pick(free.filter((key) => key !== entry.sizeKey && key !== q.shock.sizeKey));
    return withFrame(q, { entries: [{ ...entry, sizeKey }] });
  },
  'an end of the shock': (q, r) =>
    r.chance(0.5)
      ? withShock(q, { bodyEnd: otherEye(q.shock.bodyEnd, r) })
      : withShock(q, { shaftEnd: otherEye(q.shock.shaftEnd, r) }),
  'a mount of the frame': (q, r) => {
    const entry = entryOf(q);
    const where = r.pick(['frameEnd', 'linkEnd'] as const);
    const end = entry?.[where] ?? null;
    if (!entry || !nominal(end)) return null;
    const mount = otherMount(end.mount, r);
    return mount && withFrame(q, { entries: [{ ...entry, [where]: { ...end, mount } }] });
  },
  'the tunnel': (q, r) =>
    withFrame(q, { tunnelWidthMm: fact(q.shock.diameterMm + r.pick([-5, 0, 2, 3.5, 3.9])) }),
  'the can or coil': (q, r) =>
    q.frame.tunnelWidthMm &&
    withShock(q, { diameterMm: q.frame.tunnelWidthMm.value - r.pick([0, 2, 3.5, 3.9]) }),
  'a weight limit': (q, r) => {
    const limit = fact({
      kg: (q.rider.riderKg ?? 0) - r.pick([0.5, 5, 20]),
      basis: r.pick(['rider', null] as const),
    });
    return r.chance(0.5) ? withShock(q, { riderLimit: limit }) : withFrame(q, { riderLimit: limit });
  },
  'the spring that the maker allows': (q) =>
    withFrame(q, { springStatement: fact(q.shock.spring.kind === 'air' ? 'coil-only' : 'air-only') }),
  'the pressure it may hold': (q, r) =>
    q.shock.spring.kind === 'air'
      ? withShock(q, { spring: { ...q.shock.spring, minGaugeKPa: 10, maxGaugeKPa: r.pick([20, 100]) } })
      : null,
};
