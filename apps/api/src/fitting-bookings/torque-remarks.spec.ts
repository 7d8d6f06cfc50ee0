import { torqueRemarks } from './torque-remarks.js';

const ends = [
  { end: 'frame' as const, thread: 'M8' },
  { end: 'link' as const, thread: null },
];
const set = (bolt: string, setNm: number) => ({ bolt, printedNm: null, setNm });

// M8, class 8.8: 0.2 x 0.75 x 580 MPa x 36.6 mm2 x 8 mm = 25.5 N m, and a twentieth of it 1.27 N m (ISO 898-1 area).
describe('remarks on typed torques', () => {
  it.each([1.3, 16, 25.4])('say nothing of %d N m on M8', (nm) => {
    expect(torqueRemarks([set('Frame end bolt', nm)], ends)).toEqual([]);
  });

  it.each([1.2, 25.6, 160])('ask about %d N m on M8', (nm) => {
    expect(torqueRemarks([set('Frame end bolt', nm)], ends)).toEqual([
      `Frame end bolt: ${nm} N m is unusual for M8. Is it a slip?`,
    ]);
  });

  it('say so where the thread is not known, instead of borrowing the other end’s', () => {
    expect(torqueRemarks([set('Link end bolt', 160)], ends)).toEqual([
      'Link end bolt: its thread is not known, so 160 N m was not checked for a slip.',
    ]);
    expect(torqueRemarks([set('Yoke', 9)], ends)[0]).toContain('not known');
    expect(torqueRemarks([set('frame end', 9)], [{ end: 'frame', thread: 'M12' }])[0]).toContain('not known');
  });
});
