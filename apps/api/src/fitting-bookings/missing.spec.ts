import { missing } from './missing.js';

const record = {
  serialNumber: 'VT-1',
  spring: { kind: 'air' as const, gaugePsi: 176 },
  sagMm: 14,
  torques: [{ bolt: 'Frame end bolt', printedNm: null, setNm: 16 }],
  travelChecked: true,
  noticesChecked: true,
  notes: '',
};
const sent = [{ state: 'sent' as const }];

describe('what keeps a fitting from being marked done', () => {
  it('is nothing when all is sent, recorded and checked', () => {
    expect(missing('accepted', sent, record)).toEqual([]);
  });

  it.each([
    ['Not all parcels are sent yet.', [...sent, { state: 'to-send' as const }], record],
    ['The record of the fitting is not filled in.', sent, null],
    ['Move the suspension through its whole travel and say so.', sent, { ...record, travelChecked: false }],
    ['Check for recalls and say so.', sent, { ...record, noticesChecked: false }],
  ])('is "%s"', (say, parcels, given) => expect(missing('accepted', parcels, given)).toEqual([say]));

  it('is not asked of a booking that is not agreed', () => {
    expect(missing('requested', [], null)).toEqual([]);
    expect(missing('fitted', [], null)).toEqual([]);
  });
});
