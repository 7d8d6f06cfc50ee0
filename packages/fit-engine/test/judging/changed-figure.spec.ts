import { describe, expect, it } from 'vitest';

import type { FitQuestion, FrameEnd, FrameMount, ShockFacts, ShockMount } from '../../src/facts.js';
import { judge } from '../../src/judge.js';
import { sizes } from '../../src/sizing/sizes.js';
import { aCoilShock, aFrame, anEntry, aPinEnd, aQuestion, aShock, fact } from './questions.js';

const fitting = ['bolts-straight-in', 'fits-with-work'];
const verdictOf = (question: FitQuestion) => judge(question, { full: true }).verdict;
const end = (mount: FrameMount): FrameEnd => aPinEnd({ mount });

/** Mounts of a frame with the end of a shock that goes there, and all the nominals that must not. */
const pairs: { mount: FrameMount; eye: ShockMount; wrong: ShockMount[] }[] = [
  {
    mount: { kind: 'pin', diameterMm: 15, widthMm: 24 },
    eye: { kind: 'eyelet', boreMm: 15 },
    wrong: [
      ...[12.7, 14, 14.9, 15.1, 16].map((boreMm): ShockMount => ({ kind: 'eyelet', boreMm })),
      { kind: 'trunnion' },
      { kind: 'bearing-eye', boltMm: 8, widthMm: 24 },
    ],
  },
  {
    mount: { kind: 'bearing-bolt', boltMm: 8, widthMm: 30 },
    eye: { kind: 'bearing-eye', boltMm: 8, widthMm: 30 },
    wrong: [
      ...[6, 10, 12].map((boltMm): ShockMount => ({ kind: 'bearing-eye', boltMm, widthMm: 30 })),
      ...[19, 28, 29.9, 30.1, 32].map((widthMm): ShockMount => ({ kind: 'bearing-eye', boltMm: 8, widthMm })),
      { kind: 'eyelet', boreMm: 15 },
      { kind: 'trunnion' },
    ],
  },
  {
    mount: { kind: 'hardware', widthMm: 30, boltMm: 8 },
    eye: { kind: 'eyelet', boreMm: 15 },
    wrong: [{ kind: 'trunnion' }, { kind: 'bearing-eye', boltMm: 8, widthMm: 30 }],
  },
];

const asked = (link: FrameMount, shock: ShockFacts): FitQuestion =>
  aQuestion({ frame: aFrame({ entries: [anEntry({ linkEnd: end(link) })] }), shock });

describe('a shock that matches in every figure', () => {
  it.each(sizes.filter(({ strokeMm }) => strokeMm < 60).map(({ key, family }) => [key, family] as const))(
    'of size %s is never refused',
    (sizeKey, family) => {
      const body =
        family === 'trunnion' ? ({ kind: 'trunnion' } as const) : ({ kind: 'eyelet', boreMm: 15 } as const);
      const frameEnd = family === 'trunnion' ? end({ kind: 'trunnion' }) : aPinEnd();
      const travelMm = (sizes.find(({ key }) => key === sizeKey)?.strokeMm ?? 0) * 2.6;
      const frame = aFrame({ entries: [anEntry({ sizeKey, frameEnd, travelMm })] });
      expect(verdictOf(aQuestion({ frame, shock: aShock({ sizeKey, bodyEnd: body }) }))).toBe(
        'bolts-straight-in',
      );
    },
  );

  it.each(pairs.map((pair) => [pair.mount.kind, pair] as const))('on %s fits', (_kind, { mount, eye }) => {
    expect(fitting).toContain(verdictOf(asked(mount, aShock({ shaftEnd: eye }))));
  });

  it('with a coil fits with its spring', () => {
    const { verdict, parts, work } = judge(aQuestion({ shock: aCoilShock() }));
    expect(verdict).toBe('fits-with-work');
    expect(parts.map(({ kind }) => kind)).toEqual(['coil']);
    expect(work.map(({ id }) => id)).toEqual(['fit-coil']);
  });
});

describe('one hard figure changed', () => {
  it.each(sizes.filter(({ key }) => key !== '210x55').map(({ key }) => key))(
    'size %s for 210x55 is refused',
    (sizeKey) => {
      expect(verdictOf(aQuestion({ shock: aShock({ sizeKey }) }))).toBe('wont-fit');
    },
  );

  it.each(
    pairs.flatMap(({ mount, wrong }) =>
      wrong.map((eye) => [JSON.stringify(eye), mount.kind, mount, eye] as const),
    ),
  )('%s never goes on %s', (_text, _kind, mount, eye) => {
    expect(verdictOf(asked(mount, aShock({ shaftEnd: eye })))).toBe('wont-fit');
  });

  it.each([19, 22.5, 29.9, 30.1, 36, 70])(
    'hardware %s mm wide, which nobody sells, is not known',
    (widthMm) => {
      const question = asked({ kind: 'hardware', widthMm, boltMm: 8 }, aShock());
      expect(verdictOf(question)).toBe('needs-an-answer');
    },
  );

  it.each([55, 58.9, 59.9])('a tunnel of %s mm refuses a can of 56 mm', (tunnel) => {
    const frame = aFrame({ tunnelWidthMm: fact(tunnel) });
    expect(verdictOf(aQuestion({ frame, shock: aShock({ diameterMm: 56 }) }))).toBe('wont-fit');
  });

  it('two millimetres exactly on either side pass, in fractions that binary cannot hold', () => {
    for (const [tunnel, can] of [
      [60, 56],
      [60.1, 56.1],
      [64.3, 60.3],
      [59.7, 55.7],
    ] as const) {
      const frame = aFrame({ tunnelWidthMm: fact(tunnel) });
      expect(verdictOf(aQuestion({ frame, shock: aShock({ diameterMm: can }) }))).toBe('bolts-straight-in');
    }
  });

  it('a spacer never makes up for another eye-to-eye, nor lengthens a stroke', () => {
    const longer = aShock({ sizeKey: '230x60', spacedToKeys: ['210x55'] });
    const shorter = aShock({ sizeKey: '210x52.5', spacedToKeys: ['210x55'] });
    expect(verdictOf(aQuestion({ shock: longer }))).toBe('wont-fit');
    expect(verdictOf(aQuestion({ shock: shorter }))).toBe('wont-fit');
  });

  it('figures of different entries never mix', () => {
    const frame = aFrame({
      entries: [
        anEntry({
          id: 'short',
          sizeKey: '210x50',
          linkEnd: end({ kind: 'pin', diameterMm: 15, widthMm: 24 }),
        }),
        anEntry({
          id: 'long',
          sizeKey: '210x55',
          linkEnd: end({ kind: 'bearing-bolt', boltMm: 8, widthMm: 30 }),
        }),
      ],
      // Told, so that nothing is left open.
    });
    expect(verdictOf(aQuestion({ frame, shock: aShock() }))).toBe('wont-fit');
    expect(verdictOf(aQuestion({ frame, shock: aShock({ sizeKey: '210x50' }) }))).toBe('bolts-straight-in');
  });
});
