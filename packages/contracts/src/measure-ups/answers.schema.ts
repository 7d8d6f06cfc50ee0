import { z } from 'zod';
import { minor, slug } from '../common/primitives.schema.js';

/** What the rider typed, kept beside the converted figure so that it can be shown again as typed. */
export const typed = z.strictObject({
  text: z.string().max(40),
  unit: z.enum(['mm', 'in', 'kg', 'lb', 'st']),
});

const mm = (min: number, max: number) =>
  z
    .number('Enter a figure')
    .min(min, `That is shorter than any we know of (${min} mm)`)
    .max(max, `That is longer than any we know of (${max} mm)`);
const kg = (min: number, max: number) =>
  z.number('Enter a figure').min(min, `Enter ${min} kg or more`).max(max, `Enter ${max} kg or less`);

export const tool = z.enum(['print', 'caliper', 'ruler', 'tape']);
const reading = (min: number, max: number) =>
  z.strictObject({ mm: mm(min, max), tool, awkward: z.boolean().default(false), typed: typed.optional() });

export const mountKind = z.enum(['eyelet', 'bearing-eye', 'trunnion']);

/** What the frame offers one end, as the rider sees it; a null figure is "I don't know that one". */
export const frameEndAnswer = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('hardware'),
    widthMm: mm(10, 90).nullable(),
    boltMm: mm(4, 16).nullable(),
    tool,
  }),
  z.strictObject({
    kind: z.literal('pin'),
    diameterMm: mm(4, 25).nullable(),
    widthMm: mm(10, 90).nullable(),
    tool,
  }),
  z.strictObject({
    kind: z.literal('bearing-bolt'),
    boltMm: mm(4, 16).nullable(),
    widthMm: mm(5, 90).nullable(),
    tool,
  }),
  z.strictObject({ kind: z.literal('trunnion') }),
]);

const hardwareEnd = z.strictObject({
  boreMm: mm(8, 20).nullable(),
  widthMm: mm(10, 90),
  boltMm: mm(4, 16),
  sound: z.boolean().nullable(),
});

/** One schema per question; the key is also the last part of the question's address. */
export const questionSchemas = {
  // Frame
  frame: z.discriminatedUnion('kind', [
    z.strictObject({
      kind: z.literal('listed'),
      frameId: slug,
      modelYear: z.int().min(1995).max(2030).nullable(),
      frameSize: z.string().max(12).nullable(),
      chip: z.string().max(40).nullable(),
    }),
    z.strictObject({
      kind: z.literal('described'),
      name: z.string().trim().min(1, 'Give your bike a name').max(60),
    }),
  ]),
  'frame-travel': z.strictObject({ mm: mm(60, 260), typed: typed.optional() }),
  'frame-yoke': z.strictObject({ yoke: z.enum(['none', 'frame-end', 'link-end']) }),
  'frame-end': frameEndAnswer,
  'link-end': frameEndAnswer,
  'tunnel-width': z.strictObject({ mm: mm(20, 150), tool, typed: typed.optional() }),
  'reservoir-room': z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('measured'), diameterMm: mm(5, 150), lengthMm: mm(10, 300), tool }),
    z.strictObject({ kind: z.literal('none') }),
  ]),
  'cable-routing': z.strictObject({ routing: z.enum(['internal', 'external', 'none']) }),
  'e-bike': z.strictObject({ eBike: z.boolean() }),
  // Present shock
  'printed-size': z.strictObject({
    text: z.string().trim().min(3).max(40),
    sizeKey: z.string().min(3).max(20),
  }),
  'eye-to-eye': reading(120, 320),
  stroke: z.discriminatedUnion('method', [
    z.strictObject({ method: z.literal('shaft'), reading: reading(15, 110) }),
    z.strictObject({ method: z.literal('compressed'), reading: reading(70, 300) }),
  ]),
  mounts: z.strictObject({ bodyEnd: mountKind, shaftEnd: mountKind }),
  hardware: z.strictObject({ frameEnd: hardwareEnd.nullable(), linkEnd: hardwareEnd.nullable() }),
  'can-diameter': z.strictObject({ mm: mm(20, 100), tool, typed: typed.optional() }),
  'present-spring': z.strictObject({ spring: z.enum(['air', 'coil']) }),
  'present-remote': z.strictObject({
    action: z.enum(['none', 'pull-to-lock', 'pull-to-open']),
    line: z.enum(['cable', 'hydraulic']).nullable(),
  }),
  'sold-with-bike': z.strictObject({ soldWithBike: z.enum(['yes', 'no']) }),
  'size-confirm': z.strictObject({ confirmsSheetSize: z.boolean() }),
  // Spring
  'spring-wish': z.strictObject({ wish: z.enum(['air', 'coil', 'either']) }),
  // You and your riding
  weight: z.strictObject({ riderKg: kg(25, 200), kitKg: kg(0, 40), typed: typed.optional() }),
  'bike-mass': z.strictObject({ kg: kg(7, 40), typed: typed.optional() }),
  style: z.strictObject({ style: z.enum(['cross-country', 'trail', 'enduro', 'downhill']) }),
  'remote-wish': z.strictObject({ wants: z.boolean(), acceptsExternal: z.boolean().nullable() }),
  'reservoir-wish': z.strictObject({ wish: z.enum(['with', 'without', 'either']) }),
  budget: z.strictObject({ maxMinor: minor.min(50_00, 'Enter £50 or more') }),
  place: z.strictObject({ townId: slug, heightM: z.number().min(-100).max(3000).nullable() }),
} as const;

export type QuestionKey = keyof typeof questionSchemas;
export const questionKeys = Object.keys(questionSchemas) as QuestionKey[];
export type AnswerValue<K extends QuestionKey> = z.infer<(typeof questionSchemas)[K]>;

/** A question is open (absent), answered, or answered with "I don't know". */
export type StoredAnswer<K extends QuestionKey = QuestionKey> =
  { state: 'known'; value: AnswerValue<K> } | { state: 'unknown' };

export const steps = ['frame', 'present-shock', 'spring', 'rider', 'check'] as const;
export type Step = (typeof steps)[number];

/** The order of the questions, and the step each belongs to. */
export const questionOrder: readonly { key: QuestionKey; step: Step }[] = [
  ...(
    [
      'frame',
      'frame-travel',
      'frame-yoke',
      'frame-end',
      'link-end',
      'tunnel-width',
      'reservoir-room',
      'cable-routing',
      'e-bike',
    ] as const
  ).map((key) => ({ key, step: 'frame' as const })),
  ...(
    [
      'printed-size',
      'eye-to-eye',
      'stroke',
      'size-confirm',
      'mounts',
      'hardware',
      'can-diameter',
      'present-spring',
      'present-remote',
      'sold-with-bike',
    ] as const
  ).map((key) => ({ key, step: 'present-shock' as const })),
  { key: 'spring-wish', step: 'spring' },
  ...(['weight', 'bike-mass', 'style', 'remote-wish', 'reservoir-wish', 'budget', 'place'] as const).map(
    (key) => ({
      key,
      step: 'rider' as const,
    }),
  ),
];
