import { readFileSync } from 'node:fs';
import { questionKeys } from '@linkfell/contracts';
import type { APIRequestContext } from '@playwright/test';
import type { PagePath } from '../../src/app/route-list';
import { expect, type Stack } from './stack';

const headers = { 'X-Linkfell-Csrf': '1', 'Sec-Fetch-Site': 'same-origin' };
const accounts = JSON.parse(
  readFileSync(new URL('../../../../db/seeds/demo-accounts.json', import.meta.url), 'utf8'),
) as { email: string; password: string }[];
const workshop = 'tin-shed';
const shock = 'vellacott-tarn-210x50';
const refused = 'ravenbeck-scar-210x55';
const answers = {
  frame: { kind: 'listed', frameId: 'ullscar-withen-140', modelYear: 2024, frameSize: null, chip: null },
  'printed-size': { text: '210x50', sizeKey: '210x50' },
  weight: { riderKg: 80, kitKg: 3 },
  'bike-mass': { kg: 14.5 },
  style: { style: 'trail' },
  'remote-wish': { wants: false, acceptsExternal: null },
};
const contact = {
  name: 'Wren Hollis',
  email: 'wren@rider.example',
  phone: '01632 960123',
  street: '1 Beck Lane',
  town: 'Skelhow',
  postcode: 'QF1 9ZZ',
};

/** What the addresses of pages are about: one of everything that a rider and a workshop can have. */
export interface Things {
  measureUp: string;
  /** A measure-up in which nothing is answered yet. */
  empty: string;
  plan: string;
  held: string;
  paid: string;
  booking: string;
}

export interface Visit {
  who: 'rider' | 'owner';
  paths: (things: Things) => string[];
}

const rider = (...paths: string[]): Visit => ({ who: 'rider', paths: () => paths });
const about = (paths: Visit['paths']): Visit => ({ who: 'rider', paths });
const desk = (paths: Visit['paths']): Visit => ({ who: 'owner', paths });

/** Where each page of the router is visited. A page without a visit does not compile. */
export const visits: Record<PagePath, Visit> = {
  '/': rider('/'),
  '/terms': rider('/terms'),
  '/privacy': rider('/privacy'),
  '/returns': rider('/returns'),
  '/contact': rider('/contact'),
  '/help': rider('/help'),
  '/help/eye-to-eye': rider('/help/eye-to-eye'),
  '/help/stroke-is-not-travel': rider('/help/stroke-is-not-travel'),
  '/help/trunnion': rider('/help/trunnion'),
  '/help/hardware': rider('/help/hardware'),
  '/help/air-or-coil': rider('/help/air-or-coil'),
  '/help/reservoir': rider('/help/reservoir'),
  '/help/remote': rider('/help/remote'),
  '/shocks': rider('/shocks', '/shocks?q=tarn', '/shocks?q=nothing+of+that+name'),
  '/shocks/sizes/:sizeKey': rider('/shocks/sizes/210x50', '/shocks/sizes/211x55'),
  '/shocks/:sizeId': rider(`/shocks/${shock}`, '/shocks/no-such-shock'),
  '/workshops': rider('/workshops', '/workshops?from=skelhow'),
  '/workshops/:workshopId': rider(`/workshops/${workshop}`, '/workshops/nobody'),
  '/measure-up': rider('/measure-up'),
  '/measure-up/open': rider('/measure-up/open#not-a-token-that-opens'),
  '/measure-up/:id/matches': about(({ measureUp, empty }) => [
    `/measure-up/${measureUp}/matches?wontFit=shown`,
    `/measure-up/${empty}/matches`,
  ]),
  '/measure-up/:id/matches/:sizeId': about(({ measureUp }) => [
    `/measure-up/${measureUp}/matches/${shock}`,
    `/measure-up/${measureUp}/matches/${refused}`,
  ]),
  '/measure-up/:id/matches/:sizeId/curves': about(({ measureUp }) => [
    `/measure-up/${measureUp}/matches/${shock}/curves?present=hexling-moss-b-210x50`,
    `/measure-up/${measureUp}/matches/${refused}/curves`,
  ]),
  '/measure-up/:id/matches/:sizeId/clearance': about(({ measureUp }) => [
    `/measure-up/${measureUp}/matches/${refused}/clearance`,
    `/measure-up/${measureUp}/matches/${shock}/clearance`,
  ]),
  '/measure-up/:id/:question': about(({ measureUp }) =>
    [...questionKeys, 'check'].map((question) => `/measure-up/${measureUp}/${question}`),
  ),
  '/plans/:planId': about(({ plan }) => [`/plans/${plan}`]),
  '/orders/:reference': about(({ held, paid }) => [`/orders/${held}`, `/orders/${paid}`]),
  '/find-order': rider('/find-order'),
  '/sign-in': rider('/sign-in'),
  '/forgotten-password': rider('/forgotten-password'),
  '/reset-password': rider('/reset-password#0123456789abcdef0123456789abcdef'),
  '/desk': desk(() => ['/desk']),
  '/desk/:orgId/stock': desk(() => ['/desk/fellside-parts/stock', `/desk/${workshop}/stock`]),
  '/desk/:orgId/parcels': desk(() => [`/desk/${workshop}/parcels`]),
  '/desk/:orgId/bookings': desk(() => [`/desk/${workshop}/bookings`]),
  '/desk/:orgId/bookings/:bookingId': desk(({ booking }) => [`/desk/${workshop}/bookings/${booking}`]),
};

type Post = <T>(path: string, data: object, more?: Record<string, string>) => Promise<T>;

async function order(request: APIRequestContext, post: Post, measureUp: string) {
  const plan = await post<{ id: string; revision: number }>(`/api/measure-ups/${measureUp}/plans`, {
    sizeId: shock,
  });
  const choose = async <T>(data: object, revision: number): Promise<T> => {
    const answer = await request.put(`/api/plans/${plan.id}/choices`, {
      data,
      headers: { ...headers, 'If-Match': `"${revision}"` },
    });
    expect(answer.status(), await answer.text()).toBe(200);
    return (await answer.json()) as T;
  };
  const { slots, revision } = await choose<{ slots: { start: string }[]; revision: number }>(
    { fit: 'workshop', workshopId: workshop },
    plan.revision,
  );
  const { totalMinor } = await choose<{ totalMinor: number }>({ slotStart: slots[0]?.start }, revision);
  const { reference } = await post<{ reference: string }>(
    `/api/plans/${plan.id}/checkout`,
    { contact, acceptTerms: true, totalMinor },
    { 'Idempotency-Key': `visits-${plan.id}` },
  );
  return reference;
}

/** Makes one of everything as the rider whose session `request` carries. */
export async function makeThings(request: APIRequestContext, stack: Stack): Promise<Things> {
  const post: Post = async <T>(path: string, data: object, more = {}) => {
    const answer = await request.post(path, { data, headers: { ...headers, ...more } });
    expect(answer.ok(), `${path}: ${answer.status()} ${await answer.text()}`).toBe(true);
    return (await answer.json()) as T;
  };
  const { id: empty } = await post<{ id: string }>('/api/measure-ups', {});
  const { id: measureUp } = await post<{ id: string }>('/api/measure-ups', {});
  for (const [question, value] of Object.entries(answers)) {
    const answer = await request.put(`/api/measure-ups/${measureUp}/answers/${question}`, {
      data: { state: 'known', value },
      headers,
    });
    expect(answer.ok(), `${question}: ${await answer.text()}`).toBe(true);
  }
  const paid = await order(request, post, measureUp);
  const held = await order(request, post, measureUp);
  const { id: plan } = await post<{ id: string }>(`/api/measure-ups/${measureUp}/plans`, { sizeId: shock });
  const [payment] = await stack.sql(
    `SELECT p.provider_session_id AS session FROM payments p JOIN orders o ON o.id = p.order_id WHERE o.reference = $1`,
    [paid],
  );
  await fetch(`${stack.stripe.url}/_control/sessions/${String(payment?.session)}/pay`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ number: '4242424242424242' }),
  });
  const requested = () => stack.sql(`SELECT id FROM bookings WHERE state = 'requested'`);
  await expect.poll(async () => (await requested()).length).toBe(1);
  const [booking] = await requested();
  return { measureUp, empty, plan, held, paid, booking: String(booking?.id) };
}

/** Signs the session of `request` in as the owner of the workshop and of the shop whose desks are visited. */
export async function signInAsOwner(request: APIRequestContext, organisation = workshop): Promise<void> {
  const owner = accounts.find(({ email }) => email === `owner@${organisation}.example`);
  const answer = await request.post('/api/auth/sign-in', {
    data: { email: owner?.email, password: owner?.password },
    headers,
  });
  expect(answer.ok(), await answer.text()).toBe(true);
}
