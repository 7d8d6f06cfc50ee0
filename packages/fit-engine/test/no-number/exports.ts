import type { Judgement } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import * as engine from '../../src/index.js';
import { aPresentShock, aQuestion } from '../judging/questions.js';
import { spoilt } from '../judging/spoilt.js';
import {
  asIfUntold,
  givesNoNumber,
  readsNoFigure,
  refusesText,
  saysNone,
  type Complaints,
} from './complaints.js';

const question = aQuestion();
const refused = aQuestion({ shock: { ...question.shock, sizeKey: '210x50' } });

/** Numbers that the engine worked out and would show: none may be NaN or endless. What was told is shown as told. */
function workedOut({ spring, answers }: Judgement): number[] {
  const figures = answers.flatMap((given) =>
    given.figures.filter(({ source }) => source.kind === 'computed'),
  );
  return [...Object.values(spring ?? {}), ...figures.map(({ value }) => value)].filter(
    (value) => typeof value === 'number',
  );
}

/** Judged with every figure of bike, rider and shock spoilt in turn. */
const judges =
  (run: (one: FitQuestion) => Judgement[]): Complaints =>
  (by) => {
    const { frame, rider, shock } = question;
    const all = spoilt({ frame, rider, shock }, by).map((part) => ({ ...question, ...part }));
    const endless = all
      .flatMap(run)
      .flatMap(workedOut)
      .filter((value) => !Number.isFinite(value));
    return [
      ...endless.map((value) => `${value} came out`),
      ...(all.length > 15 && run(question).flatMap(workedOut).length > 3 ? [] : ['nothing was judged']),
    ];
  };

const reading = (mm: number) => ({ mm, tool: 'caliper', awkward: false }) as const;
const open = reading(210);
const figure = { key: 'shock.diameter', value: 55, unit: 'mm', source: question.shock.source } as const;
const units = ['mm', 'kg', 'N/mm', 'lb/in', 'kPa', 'psi', '%', 'm', 'deg', 'g', 'h', null] as const;
const told = engine.judge(refused, { full: true });
const size = engine.resolveSize(aPresentShock({ eyeToEye: open }), ['210x55'], 'eyelet');

/** Its sentence names the figure. */
const narrow = { code: 'diameter-too-wide', weight: 0 } as const;

const load = { loadN: 550, midPercent: 28, patmKPa: 99 };
const chambers = { areaMm2: 1000, negativeAreaMm2: 800, volumeMm3: 120000, negativeVolumeMm3: 30000 };
/** Without a load or with a spring that cannot be, the leverage is drawn alone: no number of a spring comes out. */
const seriesComplaints: Complaints = (by) =>
  [
    { kind: 'air' as const, chambers },
    { kind: 'coil' as const, rateNPerMm: 90, preloadMm: 1 },
  ].flatMap((spring) =>
    spoilt([load, spring] as const, by).flatMap(([badLoad, badSpring]) => {
      const frame = { table: null, travelMm: 145, strokeMm: 55 };
      const drawn = engine.rideSeries(frame, badLoad, badSpring);
      const whole = engine.rideSeries(frame, load, spring)?.spring ? [] : ['no spring was drawn'];
      const endless = /NaN|null\]/.test(JSON.stringify(drawn?.spring ?? 'none')) ? ['an endless figure'] : [];
      const none =
        engine.rideSeries({ ...frame, strokeMm: by }, load, spring) === null ? [] : ['a curve came out'];
      return [...whole, ...endless, ...none, ...(drawn?.spring ? ['a spring came out'] : [])];
    }),
  );
const aReservoir = {
  lengthMm: 90,
  diameterMm: 40,
  positionsDeg: [0],
  outlines: [
    {
      positionDeg: 0,
      polygon: [
        [0, -20],
        [120, -20],
        [120, 20],
        [0, 20],
      ] as [number, number][],
    },
  ],
};
const aRoom = {
  swing: [
    [0, 0],
    [55, 4],
  ] as [number, number][],
  outlines: [
    {
      name: 'down tube',
      polygon: [
        [-20, 40],
        [200, 40],
        [200, 60],
      ] as [number, number][],
      toleranceMm: 1,
      poses: null,
      moves: false,
    },
  ],
};

/** Every function that the package gives away. */
export const exported: Readonly<Record<string, Complaints>> = {
  judge: judges((one) => [engine.judge(one, { full: true })]),
  judgeAll: judges((one) => engine.judgeAll(one, [one.shock])),
  screenAll: judges((one) => engine.screenAll(one, [one.shock]).filter(engine.isJudged)),
  sift: judges((one) => engine.sift(one, [one.shock]).judged.map(({ judgement }) => judgement)),
  // Looks at whether there are answers.
  isJudged: readsNoFigure,
  fitsInstead: saysNone((one: FitQuestion) => engine.fitsInstead(one, told), refused),
  whatWouldFit: saysNone((one: FitQuestion) => engine.whatWouldFit(one, told), refused),
  // Codes and keys of sizes.
  tellInstead: readsNoFigure,
  sizeOf: refusesText(
    engine.sizeOf,
    (by) => by,
    (by) => `${by}x55`,
    (by) => `210x${by}`,
  ),
  findSizeKey: refusesText(
    engine.findSizeKey,
    (by) => by,
    (by) => `${by} x 55`,
    (by) => `210 x ${by}`,
  ),
  resolveSize: asIfUntold(
    (by) => engine.resolveSize(aPresentShock({ eyeToEye: open, compressed: reading(by) }), null, null),
    () => engine.resolveSize(aPresentShock({ eyeToEye: open }), null, null),
  ),
  // Compare keys of sizes.
  contradictsSheet: readsNoFigure,
  listedFor: readsNoFigure,
  presentSize: asIfUntold(
    (by) => engine.presentSize(question.frame, aPresentShock({ eyeToEye: open, shaftTravel: reading(by) })),
    () => engine.presentSize(question.frame, aPresentShock({ eyeToEye: open })),
  ),
  // Kinds of mounts.
  mountFamily: readsNoFigure,
  // The tool's uncertainty, whatever was read with it.
  readingUncertaintyMm: readsNoFigure,
  tell: saysNone(
    (value: number) =>
      units.map((unit) => {
        const { short, figures } = engine.tell({ ...narrow, figures: [{ ...figure, value, unit }] });
        return [short, figures.map(({ text }) => text)];
      }),
    55,
  ),
  figureText: saysNone(
    (value: number) => units.map((unit) => engine.figureText({ ...figure, value, unit })),
    55,
  ),
  // Words for work and for whom to ask, without figures.
  tellWork: readsNoFigure,
  tellAsk: readsNoFigure,
  tellSize: saysNone(engine.tellSize, size),
  torqueSlipRange: refusesText(engine.torqueSlipRange, (by) => `M${by}`),
  parseNumber: refusesText(
    engine.parseNumber,
    (by) => by,
    (by) => `${by}/8`,
    (by) => `1 ${by}/8`,
  ),
  parseLengthMm: refusesText(
    engine.parseLengthMm,
    (by) => by,
    (by) => `${by} mm`,
  ),
  parseMassKg: refusesText(
    engine.parseMassKg,
    (by) => `${by} kg`,
    (by) => `11 st ${by}`,
    (by) => `${by} st`,
  ),
  parsePressureKPa: refusesText(engine.parsePressureKPa, (by) => `${by} psi`),
  plainNumber: saysNone((value: number) => engine.plainNumber(value, 1), 5),
  formatLength: saysNone((mm: number) => [engine.formatLength(mm), engine.formatLength(mm, 'in')], 210),
  formatMass: saysNone(
    (kg: number) => (['kg', 'lb', 'st'] as const).map((unit) => engine.formatMass(kg, unit)),
    80,
  ),
  formatPressure: saysNone(
    (kPa: number) => [engine.formatPressure(kPa), engine.formatPressure(kPa, 'bar')],
    900,
  ),
  riderLoad: givesNoNumber((rider: FitQuestion['rider']) => engine.riderLoad(rider, null), question.rider),
  rideSeries: seriesComplaints,
  // What was told of the frame stands in the drawing; a spoilt part, table or position is left out.
  clearanceScene: saysNone(engine.clearanceScene, aRoom, aReservoir, {
    eyeToEyeMm: 210,
    strokeMm: 55,
    wayRound: 'body-to-frame' as const,
  }),
};
