import { describe, expect, it } from 'vitest';

import { aFrame, anEntry, aPinEnd, aQuestion, aShock, fact } from '../../test/judging/questions.js';
import type { CheckAnswer } from '../answers.js';
import type { FrameFacts, FrameOutline, Point, Reservoir } from '../facts.js';
import { judge } from '../judge.js';

const box = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];
/** A body 30 mm to one side of the axis and 40 to the other; turned round, the other way about. */
const reservoir: Reservoir = {
  lengthMm: 90,
  diameterMm: 40,
  positionsDeg: [0, 180],
  outlines: [
    { positionDeg: 0, polygon: box(10, -40, 120, 30) },
    { positionDeg: 180, polygon: box(10, -30, 120, 40) },
  ],
};
const tube = (yMm: number, over: Partial<FrameOutline> = {}): FrameOutline => ({
  name: 'down tube',
  polygon: box(-100, yMm - 40, 400, yMm),
  toleranceMm: 0,
  poses: null,
  moves: false,
  ...over,
});
const straight = [
  [0, 0],
  [60, 0],
] as const;
const room = (...outlines: FrameOutline[]): FrameFacts['room'] => ({ outlines, swing: straight });
const measured = (diameterMm: number, uncertaintyMm = 0.5) =>
  fact({ diameterMm, lengthMm: 120, uncertaintyMm });

function ask(over: Partial<FrameFacts>, carried: Reservoir | null = reservoir) {
  const shock = aShock({ reservoir: carried, wayRound: fact('body-to-frame') });
  const judged = judge(aQuestion({ frame: aFrame(over), shock }), { full: true });
  const answer = judged.answers.find(({ check }) => check === 'reservoir') as CheckAnswer;
  return { ...judged, answer, code: answer.code, kind: answer.answer };
}

describe('room for a reservoir', () => {
  it('is not asked of an inline shock, even where only inline is allowed', () => {
    expect(ask({ reservoirStatement: fact('inline-only') }, null)).toMatchObject({
      code: 'reservoir-inline',
    });
  });

  it('is refused by the maker whatever is drawn or measured', () => {
    const over: Partial<FrameFacts> = {
      reservoirStatement: fact('inline-only'),
      room: room(tube(-90)),
      reservoirRoom: measured(80),
    };
    expect(ask(over)).toMatchObject({ code: 'reservoir-refused', verdict: 'wont-fit' });
  });

  it('passes with 3 mm to the frame exactly, not with less', () => {
    expect(ask({ room: room(tube(-33)) })).toMatchObject({
      code: 'reservoir-clears-narrowly',
      reservoirPositionDeg: 180,
    });
    expect(ask({ room: room(tube(-32.9)) })).toMatchObject({ code: 'reservoir-touches', kind: 'fail' });
    expect(ask({ room: room(tube(-35)) })).toMatchObject({ code: 'reservoir-clears' });
  });

  it('takes the stated tolerance of an outline off', () => {
    expect(ask({ room: room(tube(-34, { toleranceMm: 1 })) }).kind).toBe('pass');
    expect(ask({ room: room(tube(-34, { toleranceMm: 1.1 })) }).kind).toBe('fail');
  });

  it('turns the reservoir to the position with most room, but never to one that is refused', () => {
    expect(ask({ room: room(tube(-36)), refusedPositions: fact([180]) })).toMatchObject({
      code: 'reservoir-touches',
    });
    expect(ask({ room: room(tube(-36)), refusedPositions: fact([-180]) })).toMatchObject({
      code: 'reservoir-touches',
    });
    expect(ask({ refusedPositions: fact([0, 180]) })).toMatchObject({
      code: 'reservoir-no-position-left',
      kind: 'fail',
    });
  });

  it('shows the room rounded down, so that no figure looks like enough', () => {
    const { answer } = ask({ room: room(tube(-32.99)) });
    expect(answer.figures.find(({ key }) => key === 'computed.clearance')?.value).toBe(2.9);
  });
});

describe('a permission', () => {
  const fits = fact('fits' as const);

  it('decides where nothing is drawn or measured', () => {
    expect(ask({ reservoirStatement: fits })).toMatchObject({ code: 'reservoir-stated', kind: 'pass' });
  });

  it('never overrides a collision computed', () => {
    const { answer, kind } = ask({ reservoirStatement: fits, room: room(tube(-31)) });
    expect(kind).toBe('unknown');
    expect(answer.figures.map(({ key }) => key)).toEqual(
      expect.arrayContaining(['frame.reservoir', 'computed.clearance']),
    );
  });

  it('never overrides a collision measured', () => {
    const { answer, kind } = ask({ reservoirStatement: fits, reservoirRoom: measured(41) });
    expect(kind).toBe('unknown');
    expect(answer.figures.map(({ key }) => key)).toEqual(
      expect.arrayContaining(['frame.reservoir', 'frame.roomDiameter']),
    );
  });

  it('says nothing of a part that moves in a way nobody has drawn', () => {
    const moving = tube(-90, { name: 'link', moves: true });
    for (const reservoirStatement of [fits, null]) {
      expect(ask({ reservoirStatement, room: room(moving) })).toMatchObject({
        code: 'reservoir-movement-not-drawn',
        kind: 'unknown',
      });
    }
    const half = {
      ...moving,
      poses: [
        [0, 0, 0, 0],
        [30, 0, 0, 0],
      ],
    } as const;
    expect(ask({ reservoirStatement: fits, room: room(half) }).kind).toBe('unknown');
  });
});

describe('drawings with a gap', () => {
  it.each([
    ['no swing', { outlines: [tube(-90)], swing: [] }],
    [
      'a swing that ends early',
      {
        outlines: [tube(-90)],
        swing: [
          [0, 0],
          [40, 0],
        ] as const,
      },
    ],
    ['no outline', { outlines: [], swing: straight }],
    [
      'an outline of two points',
      room(
        tube(-90, {
          polygon: [
            [0, -90],
            [200, -90],
          ],
        }),
      ),
    ],
  ])('%s: not known without the maker’s word', (_what, drawn) => {
    expect(ask({ room: drawn })).toMatchObject({ code: 'reservoir-drawing-incomplete', kind: 'unknown' });
    expect(ask({ room: drawn, reservoirStatement: fact('fits') }).kind).toBe('pass');
  });

  it('a position not drawn leaves a collision of the others not known', () => {
    const half = { ...reservoir, outlines: reservoir.outlines.slice(0, 1) };
    expect(ask({ room: room(tube(-41)) }, half)).toMatchObject({
      code: 'reservoir-drawing-incomplete',
      kind: 'unknown',
    });
  });
});

describe('the room that the rider measured', () => {
  it.each([
    [47, 'reservoir-room-measured', 'pass'],
    [46.9, 'reservoir-room-in-doubt', 'unknown'],
    [45, 'reservoir-room-in-doubt', 'unknown'],
    [44.9, 'reservoir-room-too-small', 'fail'],
    [0, 'reservoir-room-too-small', 'fail'],
  ])('%s mm for a reservoir of 40 with 3 free on each side and 0.5 uncertain', (mm, code, kind) => {
    expect(ask({ reservoirRoom: measured(mm) })).toMatchObject({ code, kind });
  });

  it('puts a drawing in doubt that says otherwise', () => {
    expect(ask({ room: room(tube(-60)), reservoirRoom: measured(41) }).kind).toBe('unknown');
  });

  it('is asked for where nothing else speaks', () => {
    expect(ask({}).answer.ask).toContainEqual({ fact: 'frame.reservoirRoom', whom: 'rider' });
  });
});

describe('the way round', () => {
  it('is chosen for the room it leaves', () => {
    // A wall near the frame end only: with the body at the link it is out of reach.
    const frame = aFrame({
      entries: [anEntry({ frameEnd: aPinEnd(), linkEnd: aPinEnd() })],
      room: room({ ...tube(0), polygon: box(5, -60, 40, -28) }),
    });
    const fixed = {
      ...reservoir,
      positionsDeg: [0],
      outlines: [{ positionDeg: 0, polygon: box(10, -30, 60, 30) }],
    };
    const judged = judge(aQuestion({ frame, shock: aShock({ reservoir: fixed }) }));
    expect(judged).toMatchObject({ wayRound: 'body-to-link', verdict: 'bolts-straight-in' });
    const ruled = { ...frame, wayRound: fact('body-to-frame' as const) };
    expect(judge(aQuestion({ frame: ruled, shock: aShock({ reservoir: fixed }) })).verdict).toBe('wont-fit');
  });
});
