import { describe, expect, it } from 'vitest';

import { readScenario } from '../src/seed/scenario.js';

const s = readScenario();
const shops = s.organisations.filter(({ isShop }) => isShop);
const workshops = s.organisations.filter(({ isWorkshop }) => isWorkshop);
/** Every kind of work that the engine can name. */
const allWork = [
  'fit-coil',
  'fit-remote',
  'fit-shock',
  'hold-open-part',
  'press-in-kit',
  'press-in-reuse',
  'route-external',
  'travel-spacer',
];

describe('traders of the district', () => {
  it('are six shops and five workshops, some both', () => {
    expect(shops).toHaveLength(6);
    expect(workshops).toHaveLength(5);
    expect(s.organisations.filter((o) => o.isShop && o.isWorkshop)).toHaveLength(2);
    expect(new Set(s.organisations.map(({ vatNumber }) => vatNumber)).size).toBe(s.organisations.length);
  });

  it.each(s.organisations.map((o) => [o.id, o] as const))('%s is plainly invented', (_id, o) => {
    expect(o.vatNumber).toMatch(/^GB 000 \d{4} \d\d$/);
    expect(o.postcode).toMatch(/^QF\d \d[A-Z]{2}$/);
    const phone = Number(/^01632 (\d{6})$/.exec(o.phone)?.[1]);
    expect(phone).toBeGreaterThanOrEqual(960_000);
    expect(phone).toBeLessThanOrEqual(960_999);
    expect(o.email).toMatch(/^[a-z.-]+@[a-z-]+\.example$/);
    const town = s.towns.find(({ id }) => id === o.townId);
    expect(Math.abs(o.latitude - (town?.latitude ?? 0))).toBeLessThan(0.03);
    expect(Math.abs(o.longitude - (town?.longitude ?? 0))).toBeLessThan(0.03);
  });

  it('live in towns of the invented map', () => {
    for (const { latitude, longitude } of s.towns) {
      expect(Math.abs(latitude - 54.9)).toBeLessThan(0.2);
      expect(Math.abs(longitude + 8.9)).toBeLessThan(0.3);
    }
  });

  it.each(s.workshops.map((w) => [w.organisationId, w] as const))('%s can be booked', (id, w) => {
    expect(workshops.map((o) => o.id)).toContain(id);
    expect(w.stands.length).toBeGreaterThan(0);
    expect(w.hours.length).toBeGreaterThan(2);
    expect(
      w.closures.some(({ firstDay, lastDay }) => firstDay <= '2026-12-25' && lastDay >= '2026-12-26'),
    ).toBe(true);
    const offered = w.services.map(({ workId }) => workId).sort();
    expect(offered).toContain('fit-shock');
    expect(allWork).toEqual(expect.arrayContaining(offered));
    for (const { minutes, priceMinor } of w.services) {
      expect(minutes % 5).toBe(0);
      expect(priceMinor).toBeGreaterThanOrEqual(500);
      expect(priceMinor).toBeLessThanOrEqual(9000);
    }
  });

  it('offer every kind of work somewhere', () => {
    const offered = new Set(s.workshops.flatMap(({ services }) => services.map(({ workId }) => workId)));
    expect([...offered].sort()).toEqual(allWork);
    expect(s.workshops).toHaveLength(5);
  });
});

describe('listings', () => {
  const items = [...s.shockSizes, ...s.coils, ...s.kits, ...s.remotes, ...s.holdOpenParts];

  it('name a shop and an item, once each', () => {
    expect(new Set(items.map(({ id }) => id)).size).toBe(items.length);
    expect(new Set(s.listings.map(({ shopId, itemId }) => `${shopId} ${itemId}`)).size).toBe(
      s.listings.length,
    );
    const known = new Set(items.map(({ id }) => id));
    const sells = new Set(shops.map(({ id }) => id));
    expect(s.listings.filter(({ shopId, itemId }) => !sells.has(shopId) || !known.has(itemId))).toEqual([]);
  });

  it('put every item on sale somewhere', () => {
    const stocked = new Set(s.listings.filter(({ quantity }) => quantity > 0).map(({ itemId }) => itemId));
    expect(items.filter(({ id }) => !stocked.has(id)).map(({ id }) => id)).toEqual([]);
  });

  it('differ in price, stock and lead time', () => {
    const prices = new Map<string, Set<number>>();
    for (const { itemId, priceMinor } of s.listings) {
      prices.set(itemId, (prices.get(itemId) ?? new Set()).add(priceMinor));
    }
    const shocks = s.shockSizes.filter(({ id }) => (prices.get(id)?.size ?? 0) > 1);
    expect(shocks.length).toBeGreaterThanOrEqual(60);
    for (const wanted of [0, 1]) {
      expect(s.listings.filter(({ quantity }) => quantity === wanted).length).toBeGreaterThanOrEqual(5);
    }
    expect(s.listings.filter(({ leadDays }) => leadDays > 0).length).toBeGreaterThanOrEqual(5);
    // The last unit anywhere: what two riders can race for.
    const units = (id: string): number =>
      s.listings.filter(({ itemId }) => itemId === id).reduce((sum, { quantity }) => sum + quantity, 0);
    expect(s.shockSizes.filter(({ id }) => units(id) === 1).length).toBeGreaterThanOrEqual(3);
  });

  it('cost what such things cost', () => {
    const range = (id: string): [number, number] =>
      s.shockSizes.some((size) => size.id === id) ? [20_000, 70_000] : [1_000, 11_000];
    for (const { itemId, priceMinor } of s.listings) {
      expect(priceMinor, itemId).toBeGreaterThanOrEqual(range(itemId)[0]);
      expect(priceMinor, itemId).toBeLessThanOrEqual(range(itemId)[1]);
    }
  });
});

describe('demo accounts', () => {
  it('cover every role, with long passwords', () => {
    const roles = s.accounts.map(({ role, memberRole }) => memberRole ?? role);
    expect(new Set(roles)).toEqual(
      new Set(['rider', 'owner', 'staff', 'mechanic', 'curator', 'administrator']),
    );
    const owners = s.accounts.filter(({ memberRole }) => memberRole === 'owner').map((a) => a.organisation);
    expect(owners.sort()).toEqual(s.organisations.map(({ id }) => id).sort());
    expect(new Set(s.accounts.map(({ password }) => password)).size).toBe(s.accounts.length);
    for (const { email, password } of s.accounts) {
      expect(email).toMatch(/^[a-z@.-]+\.example$/);
      expect(password.length).toBeGreaterThanOrEqual(15);
    }
  });
});

describe('parts', () => {
  it('cover the usual hardware and whole series of springs', () => {
    const kits = new Set(s.kits.map(({ widthMm, boltMm }) => `${widthMm}x${boltMm}`));
    expect(kits.size).toBe(s.kits.length);
    expect(Math.min(...s.kits.map(({ widthMm }) => widthMm))).toBe(19);
    expect(Math.max(...s.kits.map(({ widthMm }) => widthMm))).toBe(70);
    expect(new Set(s.kits.map(({ boltMm }) => boltMm))).toEqual(new Set([6, 8, 10, 12]));
    const steps = new Set<number>();
    const series = new Map<string, number[]>();
    for (const { makerId, travelMm, rateLbPerIn } of s.coils) {
      const name = `${makerId} ${travelMm}`;
      series.set(name, [...(series.get(name) ?? []), rateLbPerIn]);
    }
    for (const rates of series.values()) {
      rates.slice(1).forEach((rate, i) => steps.add(rate - (rates[i] ?? 0)));
    }
    expect(steps).toEqual(new Set([25, 50]));
  });
});
