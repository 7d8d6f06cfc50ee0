import type { FittingRecordBody } from '@linkfell/contracts';

import { setRows } from './set-rows.js';

const record: FittingRecordBody = {
  serialNumber: 'VT-0042-17',
  spring: { kind: 'air', gaugePsi: 176 },
  sagMm: 13.8,
  torques: [{ bolt: 'Frame end bolt', printedNm: 16, setNm: 16 }],
  travelChecked: true,
  noticesChecked: true,
  notes: '',
};

describe('rows of what was set', () => {
  it('give pressure in bar and psi, sag in mm and percent, torques in N m', () => {
    // 176 psi x 6.894757 kPa = 1213.5 kPa.
    expect(setRows(record, 50)).toEqual([
      ['Serial number', 'VT-0042-17'],
      ['Air pressure', '12.1 bar (176 psi) above the air outside'],
      ['Sag at the shock', '13.8 mm, 27.6 % of the stroke'],
      ['Frame end bolt', '16 N m'],
    ]);
  });

  it('give a coil by rate and preload, and the notes', () => {
    const coil = { kind: 'coil', rateLbPerIn: 450, preloadTurns: 1.5 } as const;
    const rows = setRows({ ...record, spring: coil, notes: 'New bush' }, 50);
    expect(rows).toContainEqual(['Spring', '450 lb/in, 1.5 turns of preload']);
    expect(rows.at(-1)).toEqual(['Notes', 'New bush']);
  });
});
