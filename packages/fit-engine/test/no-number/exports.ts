import type { Judgement } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import * as engine from '../../src/index.js';
import { aPresentShock, aQuestion } from '../judging/questions.js';
import { spoilt } from '../judging/spoilt.js';
import { asIfUntold, readsNoFigure, refusesText, saysNone, type Complaints } from './complaints.js';

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

/** Every function that the package gives away. */
export const exported: Readonly<Record<string, Complaints>> = {
  judge: judges((one) => [engine.judge(one, { full: true })]),
  judgeAll: judges((one) => engine.judgeAll(one, [one.shock])),
  screenAll: judges((one) => engine.screenAll(one, [one.shock]).filter(engine.isJudged)),
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
};
