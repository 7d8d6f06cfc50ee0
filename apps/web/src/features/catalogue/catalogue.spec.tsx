import type { ShockPage as ShockView, ShockRow, ShockSizeRow } from '@linkfell/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { answerWith } from '../../testing/answer-with';
import { setMedia } from '../../testing/browser-gaps';
import { readDimensions } from '../../testing/read-drawing';
import { renderRoutes } from '../../testing/render-page';
import { ShockPage } from './shock-page';
import { ShocksPage } from './shocks-page';
import { SizePage } from './size-page';

const routes = [
  { path: '/shocks', element: <ShocksPage /> },
  { path: '/shocks/sizes/:sizeKey', element: <SizePage /> },
  { path: '/shocks/:sizeId', element: <ShockPage /> },
];

const sizeRow = (sizeKey: string, more: Partial<ShockSizeRow> = {}): ShockSizeRow => {
  const [eyeToEyeMm = 0, strokeMm = 0] = sizeKey.split('x').map(Number);
  return {
    ...{ sizeKey, eyeToEyeMm, strokeMm },
    ...{ inches: null, family: 'eyelet', shocks: 2, fromMinor: 22599 },
    ...more,
  };
};
const eyelet = { kind: 'eyelet', boreMm: 15 } as const;
const row: ShockRow = {
  sizeId: 'maker-one-210x55',
  makerName: 'Maker',
  modelName: 'One',
  sizeKey: '210x55',
  spring: 'air',
  massG: 378,
  diameterMm: 50,
  bodyEnd: 'eyelet, bore 15 mm',
  shaftEnd: 'eyelet, bore 15 mm',
  reservoir: false,
  remote: null,
  drawing: {
    eyeToEyeMm: 210,
    strokeMm: 55,
    bodyEnd: eyelet,
    shaftEnd: eyelet,
    spring: 'air',
    diameterMm: 50,
    reservoir: null,
    remote: false,
  },
  fromMinor: 22599,
  shops: 1,
};
const source = { kind: 'maker', label: 'One data sheet', date: '2026-01-05' } as const;
const page: ShockView = {
  ...row,
  summary: 'A plain shock.',
  groups: [
    {
      title: 'Size and mounts',
      figures: [
        { label: 'Eye-to-eye', value: '210', unit: 'mm', source: null },
        { label: 'Stroke', value: '55', unit: 'mm', source: null },
      ],
    },
    {
      title: 'Limits and care',
      figures: [
        { label: 'Most weight', value: 'not stated', unit: null, source: null },
        { label: 'E-bikes', value: 'allowed', unit: null, source: { ...source, label: 'E-bike list' } },
      ],
    },
  ],
  source,
  inTheBox: ['Shock', 'Manual'],
  notInTheBox: ['A shock pump'],
  warrantyMonths: 24,
  notices: [],
  offers: [
    {
      ...{ shopId: 's1', shopName: 'The Shop', town: 'Skelhow', priceMinor: 22599, carriageMinor: 595 },
      ...{ available: 3, leadDays: 2, carrierDays: 1 },
    },
  ],
  otherSizes: [
    { sizeId: 'maker-one-210x50', sizeKey: '210x50', eyeToEyeMm: 210, strokeMm: 50, fromMinor: null },
  ],
};

beforeEach(() => setMedia());
afterEach(() => vi.unstubAllGlobals());

describe('shocks by size', () => {
  const sizes = [sizeRow('210x55'), sizeRow('230x65'), sizeRow('185x55', { family: 'trunnion' })];

  it('draws every size on one scale, apart by family, each leading to its shocks', async () => {
    answerWith({ '/shocks/sizes': { sizes } });
    renderRoutes(routes, '/shocks');
    const eyelets = within(await screen.findByRole('region', { name: 'Eyelet sizes' }));
    const links = eyelets.getAllByRole('link');
    expect(links.map((link) => link.getAttribute('href'))).toEqual([
      '/shocks/sizes/210x55',
      '/shocks/sizes/230x65',
    ]);
    expect(within(screen.getByRole('region', { name: 'Trunnion sizes' })).getAllByRole('link')).toHaveLength(
      1,
    );
    const bars = [...document.querySelectorAll('svg[data-mm]')];
    expect(new Set(bars.map((bar) => bar.getAttribute('viewBox'))).size).toBe(1);
    // What is in bracken is as long as the stroke.
    const strokes = bars.map((bar) => {
      const line = bar.querySelector('line[stroke*=bracken]');
      return Number(line?.getAttribute('x2')) - Number(line?.getAttribute('x1'));
    });
    expect(strokes).toEqual([55, 65, 55]);
  });

  it('is marked as not checked, with the way to the measure-up', async () => {
    answerWith({ '/shocks/sizes': { sizes } });
    renderRoutes(routes, '/shocks');
    expect(await screen.findByText('Not checked for your bike')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Measure up your bike' })).toHaveAttribute('href', '/measure-up');
  });

  it('narrows by the words of its sentence, keeps them in the address and hands them on', async () => {
    const asked = answerWith({ '/shocks/sizes': { sizes } });
    const { router } = renderRoutes(routes, '/shocks');
    await userEvent.selectOptions(await screen.findByRole('combobox', { name: 'Spring' }), 'coil only');
    expect(router.state.location.search).toBe('?spring=coil');
    await vi.waitFor(() => expect(asked).toContain('/api/shocks/sizes?spring=coil'));
    const [first] = within(screen.getByRole('region', { name: 'Eyelet sizes' })).getAllByRole('link');
    expect(first).toHaveAttribute('href', '/shocks/sizes/210x55?spring=coil');
  });

  it.each([
    ['55 x 210', '/shocks/sizes/210x55', ''],
    ['7.875 x 2.25 in', '/shocks/sizes/200x57', ''],
    ['tarn t', '/shocks', '?q=tarn%20t'],
  ])('finds %s', async (typed, pathname, search) => {
    answerWith({ '/shocks/sizes': { sizes }, '/shocks': { size: null, shocks: [row], total: 1 } });
    const { router } = renderRoutes(routes, '/shocks');
    await userEvent.type(await screen.findByRole('textbox', { name: 'Size or name' }), `${typed}{Enter}`);
    expect(router.state.location).toMatchObject({ pathname, search });
  });

  it('says so where nothing has that name, and where the server cannot be reached', async () => {
    answerWith({ '/shocks': { size: null, shocks: [], total: 0 } });
    renderRoutes(routes, '/shocks?q=zebra');
    expect(await screen.findByText('Nothing here is named “zebra”')).toBeInTheDocument();
    answerWith({});
    renderRoutes(routes, '/shocks');
    expect(await screen.findByText('Could not load the sizes')).toBeInTheDocument();
  });
});

describe('one size', () => {
  it('lists its shocks on one scale with price and shops, and what is easily mixed up with it', async () => {
    const { shocks: _, fromMinor: __, ...size } = sizeRow('210x55');
    const dear = { ...row, sizeId: 'maker-two-210x55', modelName: 'Two', fromMinor: null, shops: 0 };
    answerWith({
      '/shocks': { size, shocks: [row, dear], total: 2 },
      '/shocks/sizes': { sizes: [sizeRow('210x50'), sizeRow('210x55'), sizeRow('230x65')] },
    });
    renderRoutes(routes, '/shocks/sizes/210x55');
    expect(await screen.findByRole('heading', { level: 1, name: '210 × 55 mm' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Maker One' })).toHaveAttribute(
      'href',
      '/shocks/maker-one-210x55',
    );
    expect(screen.getByText('£225.99')).toBeInTheDocument();
    expect(screen.getByText('no shop has it')).toBeInTheDocument();
    const boxes = screen.getAllByRole('img').map((image) => image.getAttribute('viewBox')?.split(' '));
    expect(new Set(boxes.map((box) => `${box?.[0]} ${box?.[2]}`)).size).toBe(1);
    const near = within(await screen.findByRole('navigation', { name: 'Easily mixed up with it' }));
    expect(near.getAllByRole('link').map(({ textContent }) => textContent)).toEqual(['210 × 50 mm']);
  });

  it('refuses what is no size: there is no "close enough"', async () => {
    answerWith({ '/shocks': { size: null, shocks: [], total: 0 } });
    renderRoutes(routes, '/shocks/sizes/211x55');
    expect(
      await screen.findByRole('heading', { level: 1, name: 'There is no such size' }),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Look at all sizes' })).toHaveAttribute('href', '/shocks');
  });
});

describe('one shock', () => {
  it('shows drawing, data sheet, box, warranty, shops with VAT and days, and other sizes', async () => {
    answerWith({ '/shocks/maker-one-210x55': page });
    renderRoutes(routes, '/shocks/maker-one-210x55');
    expect(await screen.findByRole('heading', { level: 1, name: 'Maker One 210 × 55' })).toBeInTheDocument();
    const drawn = readDimensions(screen.getByRole('img', { name: 'Air shock, 210 × 55 mm' }));
    expect(drawn.find(({ key }) => key === 'stroke')?.length).toBeCloseTo(55, 5);
    expect(screen.getByRole('row', { name: 'Eye-to-eye 210 mm' })).toBeInTheDocument();
    expect(screen.getByRole('row', { name: 'Most weight not stated' })).toBeInTheDocument();
    expect(screen.getByText('E-bike list, Monday 5 January 2026')).toBeInTheDocument();
    const shop = screen.getByRole('row', { name: /The Shop/ });
    expect(shop).toHaveTextContent('sent in 2 working days, 1 day on the way');
    expect(shop).toHaveTextContent('£225.99');
    expect(screen.getByText(/VAT included, cheapest with carriage first/)).toBeInTheDocument();
    const box = within(screen.getByRole('region', { name: 'In the box' }));
    expect(box.getAllByRole('listitem').map(({ textContent }) => textContent)).toEqual([
      'Shock',
      'Manual',
      'A shock pump',
    ]);
    expect(box.getByText(/warranty is 2 years/)).toBeInTheDocument();
    const others = within(screen.getByRole('region', { name: 'The One in other sizes' }));
    expect(others.getByRole('link')).toHaveAttribute('href', '/shocks/maker-one-210x50');
    expect(others.getByText('no shop has it')).toBeInTheDocument();
  });

  it('offers nothing but the way to the measure-up: what is not checked is not sold here', async () => {
    answerWith({ '/shocks/maker-one-210x55': page });
    renderRoutes(routes, '/shocks/maker-one-210x55');
    expect(await screen.findByRole('link', { name: 'Check it for my bike' })).toHaveAttribute(
      'href',
      '/measure-up',
    );
    expect(screen.getByText('Not checked for your bike')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /buy|basket|order/i })).not.toBeInTheDocument();
  });

  it('says when nobody has it, when nothing is promised, and what its maker warns of', async () => {
    answerWith({
      '/shocks/maker-one-210x55': {
        ...page,
        ...{ fromMinor: null, shops: 0, offers: [], inTheBox: [], warrantyMonths: null },
        notices: [{ title: 'Have the shaft bolt checked', effect: 'stop', source }],
      },
    });
    renderRoutes(routes, '/shocks/maker-one-210x55');
    expect(await screen.findByText('No shop has one now')).toBeInTheDocument();
    expect(screen.getByText('Sold out')).toBeInTheDocument();
    expect(screen.getByText('The maker has stopped it')).toBeInTheDocument();
    expect(screen.getByText(/Have the shaft bolt checked/)).toBeInTheDocument();
    expect(screen.getByText('The maker does not say what is packed with it.')).toBeInTheDocument();
    expect(screen.getByText(/states no warranty/)).toBeInTheDocument();
  });

  it('is said to be missing where there is none', async () => {
    answerWith({});
    renderRoutes(routes, '/shocks/nothing');
    expect(
      await screen.findByRole('heading', { level: 1, name: 'We cannot show this shock' }),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Look at all sizes' })).toHaveAttribute('href', '/shocks');
  });

  it('explains the words of its own table, and no others', async () => {
    answerWith({ '/shocks/maker-one-210x55': { ...page, remote: 'pull-to-open' } });
    renderRoutes(routes, '/shocks/maker-one-210x55');
    const words = within(await screen.findByRole('navigation', { name: 'Words explained' }));
    expect(words.getAllByRole('link').map((link) => link.getAttribute('href'))).toEqual([
      '/help/eye-to-eye',
      '/help/stroke-is-not-travel',
      '/help/hardware',
      '/help/air-or-coil',
      '/help/remote',
    ]);
  });
});
