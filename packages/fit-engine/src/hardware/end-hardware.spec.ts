import { describe, expect, it } from 'vitest';

import type { FrameEnd, HardwareSeen, KitOnSale, ShockMount } from '../facts.js';
import { endHardware } from './end-hardware.js';

const kit = (widthMm: number, boltMm: number, boreMm = 15, id = `${widthMm}x${boltMm}`): KitOnSale => ({
  id,
  name: id,
  boreMm,
  widthMm,
  boltMm,
});
const kits = [kit(22, 8), kit(24, 8), kit(24, 10), kit(30, 8), kit(30, 8, 12.7, 'small bore')];
const eyelet: ShockMount = { kind: 'eyelet', boreMm: 15 };
const end = (widthMm: number | null, boltMm: number | null, uncertaintyMm = 0): FrameEnd => ({
  mount: { kind: 'hardware', widthMm, boltMm },
  yoke: false,
  thread: null,
  torqueNm: null,
  uncertaintyMm,
  source: { kind: 'maker', label: 'Manual', date: null },
});
const old = (over: Partial<HardwareSeen> = {}): HardwareSeen => ({
  boreMm: 15,
  widthMm: 24,
  boltMm: 8,
  sound: true,
  ...over,
});

describe('endHardware', () => {
  it('24x8 is 24 mm across for an 8 mm bolt (common practice)', () => {
    expect(endHardware(end(24, 8), eyelet, null, kits)).toEqual({
      kind: 'kit',
      kit: kits[1],
      confirmAtFitting: false,
    });
  });

  it('takes the sheet at its word: nothing near enough counts', () => {
    expect(endHardware(end(24.1, 8), eyelet, null, kits)).toMatchObject({ kind: 'none-on-sale' });
    expect(endHardware(end(30, 10), eyelet, null, kits)).toMatchObject({ kind: 'none-on-sale' });
    expect(endHardware(end(30, 8), { kind: 'eyelet', boreMm: 12.7 }, null, kits)).toMatchObject({
      kit: { id: 'small bore' },
    });
  });

  it('proposes from a reading the kits within two uncertainties', () => {
    expect(endHardware(end(24.3, 8.1, 0.25), eyelet, null, kits)).toEqual({
      kind: 'kit',
      kit: kits[1],
      confirmAtFitting: true,
    });
    expect(endHardware(end(23, 8, 0.56), eyelet, null, kits)).toMatchObject({ kind: 'several' });
    expect(endHardware(end(27, 8, 0.56), eyelet, null, kits)).toMatchObject({ kind: 'none-on-sale' });
    expect(endHardware(end(24, 8, 1.2), eyelet, null, kits)).toMatchObject({ kind: 'several' });
  });

  it('counts the same size by two makers once, the first by id', () => {
    const two = [kit(24, 8, 15, 'b'), kit(24, 8, 15, 'a')];
    expect(endHardware(end(24, 8), eyelet, null, two)).toMatchObject({ kind: 'kit', kit: { id: 'a' } });
  });

  it('moves old hardware across only if sound, of the same bore and of the right size', () => {
    expect(endHardware(end(24, 8), eyelet, old(), kits)).toEqual({ kind: 'reuse' });
    for (const over of [
      { sound: null },
      { sound: false },
      { boreMm: 12.7 },
      { boreMm: null },
      { widthMm: 25 },
      { boltMm: 10 },
      { widthMm: NaN },
    ]) {
      expect(endHardware(end(24, 8), eyelet, old(over), kits)).toMatchObject({ kind: 'kit' });
    }
  });

  it('asks where a figure is missing or is none', () => {
    for (const open of [null, end(null, 8), end(24, null), end(NaN, 8), end(24, 8, NaN)]) {
      expect(endHardware(open, eyelet, null, kits)).toEqual({ kind: 'not-measured' });
    }
  });

  it('needs nothing on pins, bearing bolts and trunnions', () => {
    const pin = { ...end(24, 8), mount: { kind: 'pin', diameterMm: 15, widthMm: 24 } } as const;
    expect(endHardware(pin, eyelet, null, [])).toEqual({ kind: 'nothing' });
    expect(endHardware({ ...pin, mount: { kind: 'trunnion' } }, { kind: 'trunnion' }, null, [])).toEqual({
      kind: 'nothing',
    });
  });
});
