import { describe, expect, it } from 'vitest';
import { contrast } from './contrast';
import { palette, type ColourName } from './palette';

/** Text colours with every ground they are used on: 4.5 to 1 (WCAG 2.2, 1.4.3). */
const text: [ColourName, ColourName[]][] = [
  [
    'ink',
    ['chalk', 'paper', 'wash', 'tarnTint', 'gorseTint', 'brickTint', 'heatherTint', 'mossTint', 'shade'],
  ],
  ['slate', ['chalk', 'paper', 'wash']],
  ['bracken', ['chalk', 'paper', 'brackenTint']],
  ['onBracken', ['bracken', 'brackenDeep']],
  ['tarn', ['chalk', 'paper', 'tarnTint']],
  ['tarnDeep', ['chalk', 'paper', 'tarnTint']],
  ['moss', ['chalk', 'paper', 'mossTint']],
  ['gorse', ['chalk', 'paper', 'gorseTint']],
  ['heather', ['chalk', 'paper', 'heatherTint']],
  ['brick', ['chalk', 'paper', 'brickTint']],
];

describe.each(['light', 'dark'] as const)('in %s mode', (mode) => {
  const pairs = text.flatMap(([name, grounds]) => grounds.map((ground) => [name, ground] as const));
  it.each(pairs)('%s can be read on %s', (name, ground) => {
    expect(contrast(palette[name][mode], palette[ground][mode])).toBeGreaterThanOrEqual(4.5);
  });

  it.each(['chalk', 'paper'] as const)('borders of inputs stand out from %s (1.4.11)', (ground) => {
    expect(contrast(palette.rule[mode], palette[ground][mode])).toBeGreaterThanOrEqual(3);
  });
});

describe('contrast', () => {
  it('is 21 for black on white, and the same either way round', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
    expect(contrast('#FFFFFF', '#000000')).toBeCloseTo(21, 5);
  });
});
