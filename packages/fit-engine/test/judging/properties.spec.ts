import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { Verdict } from '../../src/answers.js';
import type { FitQuestion, RiderFacts, ShockFacts } from '../../src/facts.js';
import { judge, judgeAll } from '../../src/judge.js';
import { sizes } from '../../src/sizing/sizes.js';
import { randomQuestion } from './random-question.js';
import { seeded } from './seeded.js';

const drawn = fc.integer({ min: 0, max: 2 ** 31 - 1 }).map((seed) => randomQuestion(seeded(seed)));
const fits = (verdict: Verdict): boolean => verdict === 'bolts-straight-in' || verdict === 'fits-with-work';
const verdictOf = (question: FitQuestion): Verdict => judge(question, { full: true }).verdict;
const runs = { numRuns: 800, seed: 20261201 } as const;

/**
 * Facts that speak for a fit. Left out on purpose: facts that object (a weight limit, a maker's rule, an outline, a
 * reading against the sheet, a year that the sheet does not have), since an objection taken away objects no longer.
 */
const riderFacts: readonly (keyof RiderFacts)[] = [
  'riderKg',
  'kitKg',
  'bikeKg',
  'style',
  'wantsRemote',
  'acceptsExternalRouting',
];
const frameFacts = [
  'springStatement',
  'coilOnYoke',
  'tunnelWidthMm',
  'reservoirStatement',
  'cableRouting',
  'eBike',
] as const;
type Removal = (question: FitQuestion) => FitQuestion;
const removals: Readonly<Record<string, Removal>> = Object.fromEntries([
  ...riderFacts.map((key): [string, Removal] => [
    `rider.${key}`,
    (q) => ({ ...q, rider: { ...q.rider, [key]: null } }),
  ]),
  ...frameFacts.map((key): [string, Removal] => [
    `frame.${key}`,
    (q) => ({ ...q, frame: { ...q.frame, [key]: null } }),
  ]),
  ...(['frameEnd', 'linkEnd', 'travelMm'] as const).map((key): [string, Removal] => [
    `entry.${key}`,
    (q) => ({ ...q, frame: { ...q.frame, entries: q.frame.entries.map((e) => ({ ...e, [key]: null })) } }),
  ]),
  ...(
    [
      'frameEndHardware',
      'linkEndHardware',
      'diameterMm',
      'spring',
      'remoteAction',
      'remoteLine',
      'soldWithBike',
    ] as const
  ).map((key): [string, Removal] => [
    `present.${key}`,
    (q) => ({ ...q, present: { ...q.present, [key]: null } }),
  ]),
  ['shock.eBikeApproved', (q) => ({ ...q, shock: { ...q.shock, eBikeApproved: null } })],
  ['shock.limits', (q) => ({ ...q, shock: withSpring(q.shock, { minGaugeKPa: null, maxGaugeKPa: null }) })],
  ['sale.kits', (q) => ({ ...q, sale: { ...q.sale, kits: [] } })],
  ['sale.coils', (q) => ({ ...q, sale: { ...q.sale, coils: [] } })],
  ['sale.remotes', (q) => ({ ...q, sale: { ...q.sale, remotes: [] } })],
]);
const withSpring = (shock: ShockFacts, over: object): ShockFacts =>
  shock.spring.kind === 'air' ? { ...shock, spring: { ...shock.spring, ...over } } : shock;

describe('a verdict', () => {
  it.each(Object.keys(removals))('never turns from not known into a fit by losing %s', (name) => {
    const remove = removals[name] as Removal;
    fc.assert(
      fc.property(drawn, (question) => {
        const before = verdictOf(question);
        const after = verdictOf(remove(question));
        if (before === 'needs-an-answer') expect(fits(after)).toBe(false);
        // Losing a fact never makes a fit better either.
        if (before === 'fits-with-work') expect(after).not.toBe('bolts-straight-in');
      }),
      { ...runs, numRuns: 250 },
    );
  });

  it('is never a fit for any other size of the catalogue', () => {
    let tried = 0;
    fc.assert(
      fc.property(drawn, fc.constantFrom(...sizes), ({ shock, ...rest }, size) => {
        const listed = rest.frame.entries.map(({ sizeKey }) => sizeKey);
        if (rest.frame.origin === 'described' || listed.includes(size.key)) return;
        tried += 1;
        const other = { ...rest, shock: { ...shock, sizeKey: size.key, spacedToKeys: [] } };
        expect(fits(verdictOf(other))).toBe(false);
      }),
      runs,
    );
    expect(tried).toBeGreaterThan(500);
  });

  it('is the same whatever the order of entries, kits, springs, levers and notices', () => {
    fc.assert(
      fc.property(drawn, (question) => {
        const { frame, sale } = question;
        const turned: FitQuestion = {
          ...question,
          frame: { ...frame, entries: frame.entries.toReversed(), notices: frame.notices.toReversed() },
          sale: {
            ...sale,
            kits: sale.kits.toReversed(),
            coils: sale.coils.toReversed(),
            remotes: sale.remotes.toReversed(),
          },
        };
        const [a, b] = [judge(question, { full: true }), judge(turned, { full: true })];
        expect(b.entryId).toBe(a.entryId);
        expect(b.parts).toEqual(a.parts);
        expect(b.answers.map(({ check, code }) => [check, code])).toEqual(
          a.answers.map(({ check, code }) => [check, code]),
        );
      }),
      runs,
    );
  });

  it('is the same whichever end of the shock is called the body, where no rule and no reservoir tells them apart', () => {
    fc.assert(
      fc.property(drawn, (question) => {
        const { shock, frame, present } = question;
        const free = { ...frame, wayRound: null };
        // The tunnel's rule of thumb compares body ends; with a known tunnel nothing does.
        if (!frame.tunnelWidthMm && present.diameterMm !== null) return;
        const plain = { ...shock, reservoir: null, wayRound: null };
        const swapped = { ...plain, bodyEnd: plain.shaftEnd, shaftEnd: plain.bodyEnd };
        expect(verdictOf({ ...question, frame: free, shock: swapped })).toBe(
          verdictOf({ ...question, frame: free, shock: plain }),
        );
      }),
      runs,
    );
  });

  it('is the worst of its answers, and the same with or without the costly checks of a refused shock', () => {
    const kinds = { pass: 0, work: 1, unknown: 2, fail: 3 };
    const names: Verdict[] = ['bolts-straight-in', 'fits-with-work', 'needs-an-answer', 'wont-fit'];
    fc.assert(
      fc.property(drawn, (question) => {
        const [full, quick] = [judge(question, { full: true }), judge(question)];
        expect(quick.verdict).toBe(full.verdict);
        const worst = Math.max(...full.answers.map(({ answer }) => kinds[answer]));
        expect(full.verdict).toBe(names[worst]);
        expect(full.answers.map(({ check }) => check)).toHaveLength(16);
        // "Parts or work" always names them, or says that a figure is the rider's and to be confirmed.
        if (full.verdict === 'bolts-straight-in') expect([...full.parts, ...full.work]).toEqual([]);
        if (question.frame.origin === 'described') expect(full.verdict).not.toBe('bolts-straight-in');
        if (question.shock.spring.kind === 'coil') expect(full.verdict).not.toBe('bolts-straight-in');
      }),
      runs,
    );
  });

  it('is the same for one shock as for many', () => {
    fc.assert(
      fc.property(drawn, fc.array(drawn, { minLength: 1, maxLength: 6 }), (base, others) => {
        const shocks = others.map(({ shock }) => shock);
        expect(judgeAll(base, shocks)).toEqual(shocks.map((shock) => judge({ ...base, shock })));
      }),
      { ...runs, numRuns: 200 },
    );
  });
});
