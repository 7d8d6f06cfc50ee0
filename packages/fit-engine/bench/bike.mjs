// One bike, its rider and what is on sale: two strokes on the sheet, drawings of the frame, hardware at both ends.
const source = { kind: 'maker', label: 'Workshop manual of the benchmark bike', date: '2026-02-01' };
const said = (value) => ({ value, source });
const lbPerIn = 0.17512683524647638;

const end = (widthMm) => ({
  mount: { kind: 'hardware', widthMm, boltMm: 8 },
  yoke: false,
  thread: 'M8',
  torqueNm: 16,
  uncertaintyMm: 0,
  source,
});
const entry = (id, strokeMm, chip) => ({
  id,
  sizeKey: `210x${strokeMm}`,
  frameEnd: end(30),
  linkEnd: end(24),
  travelMm: Math.round(strokeMm * 2.64),
  curve: {
    by: 'shock-travel',
    points: Array.from({ length: 9 }, (_, i) => [(i * strokeMm) / 8, 2.95 - 0.62 * (i / 8) ** 1.2]),
  },
  modelYears: { from: 2022, to: 2026 },
  frameSizes: null,
  chip,
  source,
});
/** A table of eleven rows over 55 mm, as sheets print them. */
const rows = (read) => Array.from({ length: 11 }, (_, i) => [5.5 * i, ...read(5.5 * i)]);
const fixed = (name, polygon) => ({ name, polygon, toleranceMm: 1, poses: null, moves: false });

export const bike = {
  frame: {
    origin: 'sheet',
    id: 'bench',
    name: 'Benchmark 145',
    sheetVersion: 1,
    entries: [entry('long', 55, null), entry('short', 50, null)],
    springStatement: said('air-and-coil'),
    coilOnYoke: null,
    tunnelWidthMm: said(66),
    reservoirStatement: null,
    reservoirRoom: null,
    room: {
      outlines: [
        fixed('down tube', [
          [-50, -146],
          [300, -162],
          [300, -118],
          [-50, -102],
        ]),
        fixed('top tube', [
          [-50, 72],
          [300, 84],
          [300, 122],
          [-50, 110],
        ]),
        fixed('bottle cage', [
          [20, -100],
          [120, -104],
          [120, -80],
          [70, -76],
          [20, -82],
        ]),
        {
          name: 'rocker brace',
          polygon: [
            [207.4, -57.8],
            [225.4, -57.8],
            [225.4, -43.8],
            [207.4, -43.8],
          ],
          toleranceMm: 1,
          moves: true,
          poses: rows((s) => [-0.03 * s, -2.6 * s, 0.7 * s]),
        },
      ],
      swing: rows((s) => [0.0012 * s * (40 - s)]),
    },
    cableRouting: said('internal'),
    eBike: said(false),
    riderLimit: said({ kg: 130, basis: 'rider-and-kit' }),
    wayRound: null,
    refusedPositions: null,
    sagTargetPercent: null,
    notices: [],
  },
  present: {
    printedSizeKey: null,
    eyeToEye: { mm: 209.8, tool: 'caliper', awkward: false },
    compressed: { mm: 156.1, tool: 'caliper', awkward: false },
    shaftTravel: null,
    bodyEndKind: 'eyelet',
    shaftEndKind: 'eyelet',
    frameEndHardware: { boreMm: 15, widthMm: 30, boltMm: 8, sound: true },
    linkEndHardware: null,
    diameterMm: 54,
    spring: 'air',
    remoteAction: 'none',
    remoteLine: null,
    soldWithBike: 'yes',
  },
  rider: {
    riderKg: 80,
    kitKg: 3,
    bikeKg: 14.5,
    style: 'trail',
    modelYear: 2024,
    frameSize: null,
    chip: null,
    springWish: 'either',
    reservoirWish: 'either',
    wantsRemote: false,
    acceptsExternalRouting: null,
    confirmsSheetSize: false,
    fillingHeightM: 200,
  },
  sale: {
    kits: [19, 22, 24, 25, 27, 30, 35, 40, 50, 54].flatMap((widthMm) =>
      [6, 8, 10].map((boltMm) => ({
        id: `kit-${widthMm}x${boltMm}`,
        name: `${widthMm}x${boltMm}`,
        boreMm: 15,
        widthMm,
        boltMm,
      })),
    ),
    coils: [52, 60, 68, 78].flatMap((travelMm) =>
      Array.from({ length: 16 }, (_, i) => 275 + 25 * i).map((rateLbPerIn) => ({
        id: `coil-${rateLbPerIn}-${travelMm}`,
        name: `${rateLbPerIn} lb/in, ${travelMm} mm`,
        rateLbPerIn,
        rateNPerMm: rateLbPerIn * lbPerIn,
        travelMm,
        insideMm: 36,
        freeLengthMm: 2 * travelMm + 16,
      })),
    ),
    remotes: [{ id: 'lever', name: 'Lever', action: 'pull-to-lock', line: 'cable' }],
    otherPartIds: ['clip'],
  },
};
