import type {
  Fact,
  FitQuestion,
  FrameEnd,
  FrameFacts,
  PartsOnSale,
  PresentShock,
  RiderFacts,
  SheetEntry,
  ShockFacts,
  Source,
} from '../../src/facts.js';

const source: Source = { kind: 'maker', label: 'Test manual', date: '2026-01-01' };
export const fact = <T>(value: T): NonNullable<Fact<T>> => ({ value, source });

export const aPinEnd = (over: Partial<FrameEnd> = {}): FrameEnd => ({
  mount: { kind: 'pin', diameterMm: 15, widthMm: 24 },
  yoke: false,
  thread: 'M8',
  torqueNm: 12,
  uncertaintyMm: 0,
  source,
  ...over,
});

export const anEntry = (over: Partial<SheetEntry> = {}): SheetEntry => ({
  id: 'entry-a',
  sizeKey: '210x55',
  frameEnd: aPinEnd(),
  linkEnd: aPinEnd(),
  travelMm: 145,
  curve: null,
  modelYears: null,
  frameSizes: null,
  chip: null,
  source,
  ...over,
});

export const aFrame = (over: Partial<FrameFacts> = {}): FrameFacts => ({
  origin: 'sheet',
  id: 'frame',
  name: 'Test frame',
  sheetVersion: 1,
  entries: [anEntry()],
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
  ...over,
});

export const aShock = (over: Partial<ShockFacts> = {}): ShockFacts => ({
  sizeId: 'shock',
  modelName: 'Test shock',
  makerName: 'Test maker',
  sizeKey: '210x55',
  spacedToKeys: [],
  bodyEnd: { kind: 'eyelet', boreMm: 15 },
  shaftEnd: { kind: 'eyelet', boreMm: 15 },
  spring: {
    kind: 'air',
    minGaugeKPa: 400,
    maxGaugeKPa: 2400,
    chambers: fact({ areaMm2: 1100, negativeAreaMm2: 950, volumeMm3: 105000, negativeVolumeMm3: 16000 }),
  },
  diameterMm: 55,
  reservoir: null,
  remote: null,
  eBikeApproved: fact(true),
  riderLimit: null,
  wayRound: null,
  tune: null,
  massG: 480,
  serviceHours: null,
  notices: [],
  source,
  ...over,
});

export const aCoilShock = (over: Partial<ShockFacts> = {}): ShockFacts =>
  aShock({
    spring: { kind: 'coil', springInsideMm: 36, maxFreeLengthMm: 150, collarPitchMm: 1.5 },
    diameterMm: 64,
    ...over,
  });

export const aPresentShock = (over: Partial<PresentShock> = {}): PresentShock => ({
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
  ...over,
});

export const aRider = (over: Partial<RiderFacts> = {}): RiderFacts => ({
  riderKg: 78,
  kitKg: 5,
  bikeKg: 14.5,
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
  ...over,
});

const lbPerIn = 0.17512683524647638;
export const someParts = (over: Partial<PartsOnSale> = {}): PartsOnSale => ({
  kits: [
    { id: 'kit-22x8', name: '22x8', boreMm: 15, widthMm: 22, boltMm: 8 },
    { id: 'kit-24x8', name: '24x8', boreMm: 15, widthMm: 24, boltMm: 8 },
    { id: 'kit-30x8', name: '30x8', boreMm: 15, widthMm: 30, boltMm: 8 },
    { id: 'kit-30x10', name: '30x10', boreMm: 15, widthMm: 30, boltMm: 10 },
  ],
  coils: [300, 325, 350, 375, 400, 425, 450, 475, 500, 525, 550, 575, 600].map((rate) => ({
    id: `coil-${rate}`,
    name: `${rate} lb/in`,
    rateNPerMm: rate * lbPerIn,
    rateLbPerIn: rate,
    travelMm: 62,
    insideMm: 36,
    freeLengthMm: 140,
  })),
  remotes: [{ id: 'lever', name: 'Lever', action: 'pull-to-lock', line: 'cable' }],
  otherPartIds: [],
  ...over,
});

/** A bike and a shock that match in everything; overrides come last. */
export const aQuestion = (over: Partial<FitQuestion> = {}): FitQuestion => ({
  frame: aFrame(),
  present: aPresentShock(),
  rider: aRider(),
  shock: aShock(),
  sale: someParts(),
  ...over,
});
