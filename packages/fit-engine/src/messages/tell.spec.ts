import { describe, expect, it } from 'vitest';

import { seeded } from '../../test/judging/seeded.js';
import { drawReadings } from '../../test/second-opinion/draw-readings.js';
import type { AskNeed, WorkId } from '../answers.js';
import { presentSize } from '../sizing/present-size.js';
import { tell, tellAsk, tellSize, tellWork } from './tell.js';

/** Whole sentences begin with a capital or a figure, end with a full stop and hide nothing that went wrong. */
function expectSentence(text: string, of: string): void {
  expect(text, of).toMatch(/^[A-Z0-9].*\.$/s);
  expect(text, of).not.toMatch(/[{}!]|NaN|Infinity|undefined|null|a figure we do not have/);
}

describe('what is said of readings, work, questions and figures', () => {
  it('is one sentence whatever was read', () => {
    const random = seeded(13);
    const states = new Set<string>();
    for (let i = 0; i < 1500; i += 1) {
      const { frame, present } = drawReadings(random);
      const size = presentSize(frame, present);
      states.add(size.state);
      expectSentence(tellSize(size), size.state);
    }
    expect([...states].sort()).toEqual(['measure-again', 'no-such-size', 'nothing-yet', 'settled']);
  });

  it('differs for every work and names the end', () => {
    const all: Record<WorkId, true> = {
      'press-in-kit': true,
      'press-in-reuse': true,
      'travel-spacer': true,
      'fit-coil': true,
      'fit-remote': true,
      'route-external': true,
      'hold-open-part': true,
      'fit-shock': true,
    };
    const ids = Object.keys(all) as WorkId[];
    const told = ids.flatMap((id) => ([null, 'frame', 'link'] as const).map((end) => tellWork({ id, end })));
    for (const text of told) expectSentence(text, 'work');
    expect(new Set(told).size).toBe(3 * ids.length);
    expect(tellWork({ id: 'press-in-kit', end: 'link' })).toMatch(/link end\.$/);
  });

  it('names whom to ask', () => {
    const whom: AskNeed['whom'][] = ['rider', 'frame-maker', 'shock-maker', 'workshop'];
    const told = whom.map((one) => tellAsk({ fact: 'frame.eBike', whom: one }));
    for (const text of told) expectSentence(text, 'ask');
    expect(new Set(told).size).toBe(4);
  });

  it('writes a figure with unit and sensible digits', () => {
    const told = tell({
      code: 'pressure-above-limit',
      weight: 0,
      figures: [
        {
          key: 'computed.pressure',
          value: 1723.7,
          unit: 'kPa',
          source: { kind: 'computed', label: 'Computed', date: null },
        },
      ],
    });
    expect(told.short).toBe('Your fill would be 17.2 bar (250 psi), above the printed maximum.');
    expect(told.figures[0]).toMatchObject({ label: 'Fill for you', text: '17.2 bar (250 psi)' });
  });
});
