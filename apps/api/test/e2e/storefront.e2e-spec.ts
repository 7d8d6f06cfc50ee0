import type { ShockList, ShockPage, ShockSizeList } from '@linkfell/contracts';

import { createListing, createShockSize } from '../factories/catalogue.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';

const tarn = 'vellacott-tarn-210x50';

describe('the storefront', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  const get = async <T>(path: string): Promise<T> =>
    (await app.client().get(`/api/shocks${path}`).expect(200)).body as T;
  const cheapest = async (where: string, ...values: unknown[]): Promise<number> => {
    const [row] = await app.manager.query<{ min: number }[]>(
      `SELECT min(l.price_minor) FROM listings l JOIN shock_sizes z ON z.item_id = l.item_id
         JOIN shock_models o ON o.id = z.model_id WHERE l.quantity > l.reserved AND ${where}`,
      values,
    );
    return row?.min ?? 0;
  };

  describe('by size', () => {
    it('counts every catalogue shock once, shortest size first, each with its cheapest free unit', async () => {
      const { sizes } = await get<ShockSizeList>('/sizes');
      const [known] = await app.manager.query<{ count: number }[]>(
        'SELECT count(*)::int AS count FROM shock_sizes',
      );
      expect(sizes.reduce((sum, { shocks }) => sum + shocks, 0)).toBe(known?.count);
      const lengths = sizes.map(({ eyeToEyeMm, strokeMm }) => eyeToEyeMm * 1000 + strokeMm);
      expect(lengths).toEqual([...lengths].sort((a, b) => a - b));
      const size = sizes.find(({ sizeKey }) => sizeKey === '210x50');
      expect(size).toMatchObject({ family: 'eyelet', inches: null, eyeToEyeMm: 210, strokeMm: 50 });
      expect(size?.fromMinor).toBe(await cheapest(`z.size_key = '210x50'`));
    });

    it('narrows by spring and reservoir, for counts and prices alike', async () => {
      const { sizes } = await get<ShockSizeList>('/sizes?spring=coil&reservoir=with');
      const rows = await app.manager.query<{ size_key: string; count: number }[]>(
        `SELECT z.size_key, count(*)::int FROM shock_sizes z JOIN shock_models o ON o.id = z.model_id
          WHERE o.spring = 'coil' AND z.facts->'reservoir' <> 'null' GROUP BY 1 ORDER BY 1`,
      );
      expect(rows.length).toBeGreaterThan(0);
      expect(sizes.map(({ sizeKey, shocks }) => ({ size_key: sizeKey, count: shocks }))).toEqual(
        expect.arrayContaining(rows),
      );
      expect(sizes).toHaveLength(rows.length);
    });

    it('knows a size by its other labels, and says when a label is none', async () => {
      const label = encodeURIComponent('7.875 x 2.25');
      const { size, shocks } = await get<ShockList>(`?size=${label}`);
      expect(size).toMatchObject({ sizeKey: '200x57', family: 'inch', inches: '7.875 x 2.25' });
      expect(new Set(shocks.map(({ sizeKey }) => sizeKey))).toEqual(new Set(['200x57']));
      expect(await get<ShockList>('?size=211x55')).toEqual({ size: null, shocks: [], total: 0 });
    });
  });

  it('finds by every word of a name, cheapest first, with what nobody has at the end', async () => {
    const { itemId } = await createShockSize(app.manager, { modelName: 'Zzyx Needle', sizeKey: '230x60' });
    const dear = await createShockSize(app.manager, { modelName: 'Zzyx Needle', sizeKey: '230x65' });
    await createListing(app.manager, dear.itemId, { priceMinor: 900_00 });
    const cheap = await createShockSize(app.manager, { modelName: 'Zzyx Needle', sizeKey: '210x55' });
    await createListing(app.manager, cheap.itemId, { priceMinor: 300_00 });
    await createListing(app.manager, cheap.itemId, { priceMinor: 200_00, quantity: 1, reserved: 1 });
    const { shocks, total } = await get<ShockList>('?q=needle%20ZZYX');
    expect(shocks.map(({ sizeId, fromMinor, shops }) => [sizeId, fromMinor, shops])).toEqual([
      [cheap.itemId, 300_00, 1],
      [dear.itemId, 900_00, 1],
      [itemId, null, 0],
    ]);
    expect(total).toBe(3);
    expect(await get<ShockList>('?q=needle%20nowhere')).toMatchObject({ shocks: [], total: 0 });
    // Neither of these is a pattern.
    expect(await get<ShockList>('?q=%25')).toMatchObject({ total: 0 });
    expect(await get<ShockList>('?q=_eedle')).toMatchObject({ total: 0 });
  });

  describe('a page', () => {
    it('shows data sheet, box, warranty, mass and who has it', async () => {
      const page = await get<ShockPage>(`/${tarn}`);
      expect(page).toMatchObject({
        makerName: 'Vellacott',
        modelName: 'Tarn',
        spring: 'air',
        warrantyMonths: 24,
        inTheBox: ['Shock, at low pressure for the journey', 'One volume spacer', 'Manual'],
        notInTheBox: ['Mounting hardware for its two eyelets', 'A shock pump'],
      });
      const figures = page.groups.flatMap((group) => group.figures);
      expect(figures).toContainEqual({ label: 'Eye-to-eye', value: '210', unit: 'mm', source: null });
      expect(figures).toContainEqual({ label: 'Stroke', value: '50', unit: 'mm', source: null });
      expect(figures).toContainEqual({ label: 'Mass', value: String(page.massG), unit: 'g', source: null });
      expect(page.offers.length).toBeGreaterThan(0);
      expect(page.fromMinor).toBe(await cheapest('z.item_id = $1', tarn));
      expect(page.shops).toBe(page.offers.length);
      const [model] = await app.manager.query<{ count: number }[]>(
        `SELECT count(*)::int AS count FROM shock_sizes WHERE model_id = 'vellacott-tarn'`,
      );
      expect(page.otherSizes).toHaveLength((model?.count ?? 0) - 1);
      expect(page.otherSizes.map(({ sizeId }) => sizeId)).not.toContain(tarn);
    });

    it('lists shops by price with carriage, and none whose last unit is promised', async () => {
      const { itemId } = await createShockSize(app.manager);
      const near = await createListing(app.manager, itemId, { priceMinor: 410_00, leadDays: 2 });
      await createListing(app.manager, itemId, { priceMinor: 100_00, quantity: 2, reserved: 2 });
      const { offers } = await get<ShockPage>(`/${itemId}`);
      expect(offers).toEqual([
        expect.objectContaining({ shopId: near.shopId, priceMinor: 410_00, available: 5, leadDays: 2 }),
      ]);
    });

    it('says "not stated" rather than nothing, and shows a notice of the maker', async () => {
      const source = { kind: 'maker', label: 'Notice 7', date: '2026-02-01' } as const;
      const { itemId } = await createShockSize(app.manager, {
        tune: null,
        serviceHours: null,
        notices: [{ id: 'n7', title: 'Have the shaft bolt checked', effect: 'stop', source }],
        spring: { kind: 'air', minGaugeKPa: null, maxGaugeKPa: null, chambers: null },
        remote: { action: 'pull-to-open', line: 'hydraulic', holdOpenPartId: null },
        bodyEnd: { kind: 'trunnion' },
      });
      const page = await get<ShockPage>(`/${itemId}`);
      const stated = Object.fromEntries(
        page.groups.flatMap(({ figures }) => figures.map(({ label, value, unit }) => [label, [value, unit]])),
      );
      expect(stated).toMatchObject({
        Tune: ['not stated', null],
        'Service every': ['not stated', null],
        'Most weight': ['not stated', null],
        'Pressure, least to most': ['not stated', null],
      });
      expect(page.notices).toEqual([{ title: 'Have the shaft bolt checked', effect: 'stop', source }]);
      expect(page.warrantyMonths).toBeNull();
      expect(page.notInTheBox).toEqual([
        'Mounting hardware for its one eyelet',
        'A shock pump',
        'The lever at the bar and its hydraulic line',
      ]);
    });

    it('is not there for an unknown id, nor for what cannot be one', async () => {
      await app.client().get('/api/shocks/no-such-shock').expect(404);
      await app.client().get('/api/shocks/No%20Such').expect(404);
      const { body } = await app.client().get('/api/shocks?spring=steel').expect(422);
      expect(body.errors).toHaveLength(1);
    });
  });
});
