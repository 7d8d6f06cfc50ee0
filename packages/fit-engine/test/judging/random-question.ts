import type {
  FitQuestion,
  FrameEnd,
  FrameFacts,
  FrameMount,
  FrameRoom,
  PresentShock,
  Reading,
  RiderFacts,
  SheetEntry,
  ShockFacts,
  ShockMount,
  WeightLimit,
} from '../../src/facts.js';
import { aFrame, aPinEnd, aPresentShock, aQuestion, aRider, aShock, anEntry, fact } from './questions.js';
import type { Random } from './seeded.js';

/** How odd the present question may be: scales every chance of something going wrong. */
let mess = 1;
const odd = (r: Random, p: number): boolean => r.chance(p * mess);
/** The good value, or now and then one of the others. */
const mostly = <T>(r: Random, good: T, others: readonly T[], p = 0.25): T =>
  odd(r, p) ? r.pick(others) : good;

const eyeletKeys = ['210x50', '210x52.5', '210x55', '190x50', '230x60'] as const;
const trunnionKeys = ['185x50', '185x52.5', '185x55'] as const;

function frameMount(r: Random): FrameMount {
  const kind = r.pick(['hardware', 'hardware', 'pin', 'pin', 'pin', 'bearing-bolt'] as const);
  if (kind === 'hardware') {
    return {
      kind,
      widthMm: mostly<number | null>(r, 30, [null, 24, 30.8, 23, 27], 0.3),
      boltMm: mostly<number | null>(r, 8, [null, 10], 0.05),
    };
  }
  if (kind === 'pin')
    return { kind, diameterMm: mostly<number | null>(r, 15, [null, 14, 14.3], 0.12), widthMm: 24 };
  return { kind, boltMm: mostly<number | null>(r, 8, [null, 10], 0.15), widthMm: 30 };
}

const frameEnd = (r: Random, mount: FrameMount): FrameEnd =>
  aPinEnd({
    mount,
    yoke: odd(r, 0.12) ? null : odd(r, 0.3),
    uncertaintyMm: mostly(r, 0, [0.25, 0.56, 1.2], 0.3),
  });

function suited(r: Random, mount: FrameMount | undefined): ShockMount {
  if (odd(r, 0.05)) return { kind: 'bearing-eye', boltMm: 8, widthMm: 30 };
  switch (mount?.kind) {
    case 'trunnion':
      return odd(r, 0.05) ? { kind: 'eyelet', boreMm: 15 } : { kind: 'trunnion' };
    case 'bearing-bolt':
      return { kind: 'bearing-eye', boltMm: 8, widthMm: mostly(r, 30, [28], 0.15) };
    case 'hardware':
    case 'pin':
    case undefined:
      return { kind: 'eyelet', boreMm: mostly(r, 15, [12.7], 0.15) };
  }
}

function entry(r: Random, id: string, key: string | null, trunnion: boolean): SheetEntry {
  const first: FrameMount = trunnion ? { kind: 'trunnion' } : frameMount(r);
  const stroke = Number((key ?? '210x55').split('x')[1]);
  const falling: readonly (readonly [number, number])[] = [
    [0, 3],
    [stroke / 2, 2.7],
    [stroke, 2.4],
  ];
  return anEntry({
    id,
    sizeKey: key,
    frameEnd: odd(r, 0.04) ? null : frameEnd(r, first),
    linkEnd: odd(r, 0.04) ? null : frameEnd(r, frameMount(r)),
    travelMm: odd(r, 0.06) ? null : Math.round(stroke * 2.7),
    curve: r.chance(0.4) ? { by: 'shock-travel', points: falling } : null,
    modelYears: odd(r, 0.4)
      ? r.pick([
          { from: 2020, to: 2022 },
          { from: 2023, to: 2025 },
        ])
      : null,
    frameSizes: odd(r, 0.25) ? r.pick([['S', 'M'], ['L']]) : null,
    chip: odd(r, 0.2) ? r.pick(['high', 'low']) : null,
  });
}

/** A flat wall under the shock, so that a plain second calculation can say how far away it is. */
function room(r: Random): FrameRoom {
  const top = -mostly(r, 52, [44, 45.2, 47, 58], 0.6);
  const brace = { name: 'brace', polygon: square(60, 70, 300, 90), toleranceMm: 1, poses: null };
  return {
    outlines: [
      { name: 'tube', polygon: square(-50, top - 30, 300, top), toleranceMm: 0.5, poses: null, moves: false },
      ...(odd(r, 0.3) ? [{ ...brace, moves: r.chance(0.5) }] : []),
    ],
    swing: [
      [0, 0],
      [80, 0],
    ],
  };
}
const square = (x0: number, y0: number, x1: number, y1: number): [number, number][] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

const limit = (r: Random): WeightLimit => ({
  kg: r.pick([85, 95, 100, 110, 120]),
  basis: r.pick(['rider', 'rider-and-kit', 'with-bike', null]),
});

function frame(r: Random): FrameFacts {
  const described = r.chance(0.12);
  const trunnion = r.chance(0.3);
  const keys = trunnion ? trunnionKeys : eyeletKeys;
  const count = described || r.chance(0.65) ? 1 : 2;
  const entries = Array.from({ length: count }, (_, i) =>
    entry(r, `entry-${i}`, described ? null : r.pick(keys), trunnion),
  );
  return aFrame({
    origin: described ? 'described' : 'sheet',
    entries,
    springStatement: odd(r, 0.3) ? null : fact(mostly(r, 'air-and-coil', ['air-only', 'coil-only'], 0.3)),
    coilOnYoke: r.chance(0.4) ? null : fact(r.pick(['allowed', 'refused'])),
    tunnelWidthMm: odd(r, 0.2) ? null : fact(mostly(r, 70, [59, 63, 66, 68], 0.3)),
    reservoirStatement: r.chance(0.5) ? null : fact(mostly(r, 'fits', ['inline-only'], 0.3)),
    reservoirRoom: r.chance(0.6)
      ? null
      : fact({
          diameterMm: mostly(r, 52, [30, 44, 46, 47], 0.5),
          lengthMm: r.pick([100, 110]),
          uncertaintyMm: r.pick([0.25, 0.86]),
        }),
    room: r.chance(0.4) ? room(r) : null,
    cableRouting: odd(r, 0.2) ? null : fact(mostly(r, 'internal', ['external', 'none'], 0.6)),
    eBike: odd(r, 0.1) ? null : fact(odd(r, 0.3)),
    riderLimit: odd(r, 0.4) ? fact(limit(r)) : null,
    wayRound: !odd(r, 0.3) ? null : fact(r.pick(['body-to-frame', 'body-to-link'])),
    refusedPositions: !odd(r, 0.2) ? null : fact(r.pick([[0], [180], [0, 180]])),
    sagTargetPercent: r.chance(0.85) ? null : fact(r.pick([25, 28, 30])),
    notices: odd(r, 0.1)
      ? [{ id: 'n', title: 'Notice', effect: r.pick(['stop', 'remark']), source: fact(0).source }]
      : [],
  });
}

const body = (down: boolean): [number, number][] => square(-20, down ? -42 : -28, 130, down ? 28 : 42);

function shock(r: Random, of: FrameFacts): ShockFacts {
  const target = r.pick(of.entries);
  const key = target.sizeKey ?? '210x55';
  const trunnion = target.frameEnd?.mount.kind === 'trunnion';
  const sizeKey = !odd(r, 0.25) ? key : r.pick(trunnion ? trunnionKeys : eyeletKeys);
  const [eye] = sizeKey.split('x');
  const ends = [suited(r, target.frameEnd?.mount), suited(r, target.linkEnd?.mount)] as const;
  const [bodyEnd, shaftEnd] = trunnion || r.chance(0.5) ? ends : [ends[1], ends[0]];
  const coil = r.chance(0.35);
  return aShock({
    sizeKey,
    spacedToKeys: r.chance(0.4) ? [`${eye}x50`, `${eye}x52.5`] : [],
    bodyEnd,
    shaftEnd,
    spring: coil
      ? {
          kind: 'coil',
          springInsideMm: mostly(r, 36, [38], 0.1),
          maxFreeLengthMm: 150,
          collarPitchMm: r.pick([null, 1, 1.5]),
        }
      : {
          kind: 'air',
          minGaugeKPa: mostly<number | null>(r, 500, [null, 1400], 0.12),
          maxGaugeKPa: mostly(r, 2400, [1000, 1500], 0.3),
          chambers: r.chance(0.3)
            ? null
            : fact({
                areaMm2: r.pick([900, 1100]),
                negativeAreaMm2: 850,
                volumeMm3: 105000,
                negativeVolumeMm3: 16000,
              }),
        },
    diameterMm: mostly(r, 55, [60, 64, 66, 66.1], 0.4),
    reservoir: r.chance(0.35)
      ? {
          lengthMm: 90,
          diameterMm: 40,
          positionsDeg: r.pick([[0], [0, 180]]),
          outlines: r.chance(0.2)
            ? [{ positionDeg: 0, polygon: body(true) }]
            : [
                { positionDeg: 0, polygon: body(true) },
                { positionDeg: 180, polygon: body(false) },
              ],
        }
      : null,
    remote: r.chance(0.25)
      ? {
          action: mostly(r, 'pull-to-lock', ['pull-to-open'], 0.5),
          line: r.pick(['cable', 'hydraulic']),
          holdOpenPartId: r.pick([null, 'clip', 'other']),
        }
      : null,
    eBikeApproved: odd(r, 0.3) ? null : fact(!odd(r, 0.25)),
    riderLimit: odd(r, 0.4) ? fact(limit(r)) : null,
    wayRound: !odd(r, 0.3) ? null : fact(r.pick(['body-to-frame', 'body-to-link'])),
    notices: odd(r, 0.06)
      ? [{ id: 's', title: 'Recall', effect: r.pick(['stop', 'remark']), source: fact(0).source }]
      : [],
    serviceHours: r.pick([null, 50, 100]),
    tune: r.pick([null, 'low', 'middle', 'high']),
  });
}

function present(r: Random, of: FrameFacts): PresentShock {
  const key = !odd(r, 0.15) ? (r.pick(of.entries).sizeKey ?? '210x55') : '210x50';
  const [eye = 0, stroke = 0] = key.split('x').map(Number);
  const read = (mm: number): Reading => ({
    mm: mm + r.between(-0.4, 0.4),
    tool: r.pick(['caliper', 'caliper', 'ruler', 'tape']),
    awkward: r.chance(0.2),
  });
  const seen = () =>
    r.chance(0.25)
      ? {
          boreMm: r.pick([15, 15, 12.7, null]),
          widthMm: r.pick([24, 30, 30.3]),
          boltMm: 8,
          sound: r.pick([true, true, false, null]),
        }
      : null;
  const measured = r.chance(of.origin === 'described' ? 0.9 : 0.3);
  return aPresentShock({
    printedSizeKey: r.chance(of.origin === 'described' ? 0.5 : 0.08) ? key : null,
    eyeToEye: measured ? read(eye) : null,
    compressed: measured && r.chance(0.6) ? read(eye - stroke + r.between(0, 1.5)) : null,
    shaftTravel: measured && r.chance(0.4) ? read(stroke - r.between(0, 1.5)) : null,
    bodyEndKind: r.pick([null, 'eyelet', 'trunnion']),
    shaftEndKind: r.pick([null, 'eyelet']),
    frameEndHardware: seen(),
    linkEndHardware: seen(),
    diameterMm: r.pick([null, 55, 60, 66]),
    spring: r.pick([null, 'air', 'air', 'coil']),
    remoteAction: r.pick([null, 'none', 'pull-to-lock', 'pull-to-open']),
    remoteLine: r.pick([null, 'cable', 'hydraulic']),
    soldWithBike: mostly<'yes' | 'no' | 'unsure' | null>(r, 'yes', ['no', 'unsure', null], 0.4),
  });
}

const rider = (r: Random): RiderFacts =>
  aRider({
    riderKg: odd(r, 0.06) ? null : mostly(r, 78, [42, 55, 70, 85, 95, 105, 140], 0.5),
    kitKg: odd(r, 0.04) ? null : 5,
    bikeKg: odd(r, 0.04) ? null : r.pick([13, 14.5, 22]),
    style: odd(r, 0.06) ? null : r.pick(['cross-country', 'trail', 'enduro', 'downhill']),
    modelYear: r.pick([null, 2021, 2024]),
    frameSize: r.pick([null, 'M', 'L']),
    chip: r.pick([null, 'high', 'low']),
    wantsRemote: odd(r, 0.08) ? null : odd(r, 0.35),
    acceptsExternalRouting: r.pick([null, true, false]),
    confirmsSheetSize: r.chance(0.2),
    fillingHeightM: r.pick([0, 200, 1500]),
  });

/** One question, near enough to a match that every verdict and every check gets its turn. */
export function randomQuestion(r: Random): FitQuestion {
  mess = r.pick([0.05, 0.15, 0.3, 0.6, 1]);
  const of = frame(r);
  const base = aQuestion();
  return {
    frame: of,
    present: present(r, of),
    rider: rider(r),
    shock: shock(r, of),
    sale: {
      ...base.sale,
      otherPartIds: !odd(r, 0.4) ? ['clip'] : [],
      remotes: !odd(r, 0.15) ? base.sale.remotes : [],
    },
  };
}
