import type {
  Fact,
  FitQuestion,
  FrameEnd,
  FrameMount,
  PresentShock,
  ShockFacts,
  Source,
} from '../../src/facts.js';

export const manual: Source = { kind: 'maker', label: 'Manual of the test', date: '2026-01-01' };
export const fact = <T>(value: T): NonNullable<Fact<T>> => ({ value, source: manual });

export const frameEnd = (mount: FrameMount, more: Partial<FrameEnd> = {}): FrameEnd => ({
  mount,
  yoke: false,
  thread: 'M8',
  torqueNm: null,
  uncertaintyMm: 0,
  source: manual,
  ...more,
});

const pin: FrameMount = { kind: 'pin', diameterMm: 15, widthMm: 24 };

const nothingMeasured: PresentShock = {
  printedSizeKey: null,
  eyeToEye: null,
  compressed: null,
  shaftTravel: null,
  bodyEndKind: null,
  shaftEndKind: null,
  frameEndHardware: null,
  linkEndHardware: null,
  diameterMm: null,
  spring: null,
  remoteAction: null,
  remoteLine: null,
  soldWithBike: null,
};

const airShock: ShockFacts = {
  sizeId: 's',
  modelName: 'Model',
  makerName: 'Maker',
  sizeKey: '210x55',
  spacedToKeys: [],
  bodyEnd: { kind: 'eyelet', boreMm: 15 },
  shaftEnd: { kind: 'eyelet', boreMm: 15 },
  spring: { kind: 'air', minGaugeKPa: 300, maxGaugeKPa: 2400, chambers: null },
  diameterMm: 56,
  reservoir: null,
  remote: null,
  eBikeApproved: fact(true),
  riderLimit: fact({ kg: 120, basis: 'rider-and-kit' }),
  wayRound: null,
  tune: 'middle',
  massG: 480,
  serviceHours: 100,
  notices: [],
  source: manual,
};

/** A question whose every figure agrees: air on two pins, nothing to buy or do. */
export const matching: FitQuestion = {
  frame: {
    origin: 'sheet',
    id: 'f',
    name: 'Frame',
    sheetVersion: 1,
    entries: [
      {
        id: 'a',
        sizeKey: '210x55',
        frameEnd: frameEnd(pin),
        linkEnd: frameEnd(pin),
        travelMm: 150,
        curve: null,
        modelYears: null,
        frameSizes: null,
        chip: null,
        source: manual,
      },
    ],
    springStatement: fact('air-and-coil'),
    coilOnYoke: null,
    tunnelWidthMm: fact(70),
    reservoirStatement: null,
    reservoirRoom: null,
    room: null,
    cableRouting: fact('internal'),
    eBike: fact(false),
    riderLimit: null,
    wayRound: null,
    refusedPositions: null,
    sagTargetPercent: null,
    notices: [],
  },
  present: nothingMeasured,
  rider: {
    riderKg: 78,
    kitKg: 4,
    bikeKg: 15,
    style: 'trail',
    modelYear: null,
    frameSize: null,
    chip: null,
    springWish: 'either',
    reservoirWish: 'either',
    wantsRemote: false,
    acceptsExternalRouting: null,
    confirmsSheetSize: false,
    fillingHeightM: 200,
  },
  shock: airShock,
  sale: {
    kits: [
      { id: 'kit-30x8', name: 'Kit 30x8', boreMm: 15, widthMm: 30, boltMm: 8 },
      { id: 'kit-31x8', name: 'Kit 31x8', boreMm: 15, widthMm: 31, boltMm: 8 },
      { id: 'kit-40x8', name: 'Kit 40x8', boreMm: 15, widthMm: 40, boltMm: 8 },
      { id: 'kit-40x10', name: 'Kit 40x10', boreMm: 15, widthMm: 40, boltMm: 10 },
    ],
    // Springs of every 25 lb/in, long enough for a stroke of 60 mm.
    coils: Array.from({ length: 18 }, (_, i) => ({
      id: `coil-${200 + 25 * i}`,
      name: `Spring ${200 + 25 * i}`,
      rateLbPerIn: 200 + 25 * i,
      rateNPerMm: ((200 + 25 * i) * 0.45359237 * 9.80665) / 25.4,
      travelMm: 68,
      insideMm: 36,
      freeLengthMm: 150,
    })),
    remotes: [{ id: 'lever-lock', name: 'Lever', action: 'pull-to-lock', line: 'cable' }],
    otherPartIds: ['hold-1'],
  },
};
