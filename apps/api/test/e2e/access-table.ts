/**
 * Who may call what, written down by hand: a change of access shows in review as a change of this file.
 * `measure-up guest` holds the measure-up by its link only, `guest` the order as well; `rider` has an account to
 * which the measure-up belongs. The walk proves the guard; rows below a route (a booking of another workshop under
 * one's own `:orgId`) are proved by the feature's own tests.
 */
export const roles = [
  'anonymous',
  'measure-up guest',
  'guest',
  'rider',
  'other rider',
  'shop staff',
  'shop owner',
  'other shop owner',
  'mechanic',
  'workshop owner',
  'other workshop owner',
  'curator',
  'administrator',
] as const;
export type Role = (typeof roles)[number];

/** `in`, or the status of the refusal. */
export type Access = 'in' | 401 | 403 | 404;
export type Row = Record<Role, Access>;

const withoutAccount: readonly Role[] = ['anonymous', 'measure-up guest', 'guest'];
const row = (otherwise: (role: Role) => Access, exceptions: Partial<Row>): Row =>
  Object.fromEntries(roles.map((role) => [role, exceptions[role] ?? otherwise(role)])) as Row;
const accountOr = (access: Access) => (role: Role) => (withoutAccount.includes(role) ? 401 : access);

const everybody = row(() => 'in', {});
const signedIn = row(accountOr('in'), {});

/** The patterns that features use; a route that differs writes its own row. */
export const shopMembers = row(accountOr(404), { 'shop staff': 'in', 'shop owner': 'in' });
export const workshopMembers = row(accountOr(404), { mechanic: 'in', 'workshop owner': 'in' });
/** Owner and staff promise dates, mechanics do not. */
export const workshopDecides = row(accountOr(404), { mechanic: 403, 'workshop owner': 'in' });
export const measureUpHolders = row(() => 404, { 'measure-up guest': 'in', guest: 'in', rider: 'in' });
export const orderHolders = row(() => 404, { guest: 'in', rider: 'in' });

/** One line per route; a route that is missing here, or a line without a route, fails the test. */
export const accessTable: Record<string, Row> = {
  'GET /health/live': everybody,
  'GET /health/ready': everybody,
  'GET /metrics': everybody,
  'GET /api/openapi.json': everybody,

  'GET /api/auth/me': everybody,
  'POST /api/auth/sign-in': everybody,
  'POST /api/auth/sign-out': signedIn,
  'POST /api/auth/password-reset': everybody,
  'POST /api/auth/password-reset/confirm': everybody,

  'GET /api/frames': everybody,
  'GET /api/frames/:frameId': everybody,
  'GET /api/towns': everybody,
  'GET /api/shocks': everybody,
  'GET /api/shocks/sizes': everybody,
  'GET /api/shocks/:sizeId': everybody,
  'GET /api/workshops': everybody,
  'GET /api/workshops/:workshopId': everybody,

  'POST /api/measure-ups': everybody,
  'POST /api/measure-ups/open': everybody,
  'GET /api/measure-ups/:id': measureUpHolders,
  'PUT /api/measure-ups/:id/answers/:question': measureUpHolders,
  'DELETE /api/measure-ups/:id/answers/:question': measureUpHolders,
  'POST /api/measure-ups/:id/links': measureUpHolders,
  'DELETE /api/measure-ups/:id/links': measureUpHolders,
  'GET /api/measure-ups/:id/matches': measureUpHolders,
  'GET /api/measure-ups/:id/matches/:sizeId': measureUpHolders,
  'GET /api/measure-ups/:id/matches/:sizeId/clearance': measureUpHolders,
  'GET /api/measure-ups/:id/matches/:sizeId/curves': measureUpHolders,
  'POST /api/measure-ups/:id/plans': measureUpHolders,

  'GET /api/plans/:id': measureUpHolders,
  'PUT /api/plans/:id/choices': measureUpHolders,
  'POST /api/plans/:id/checkout': measureUpHolders,

  'POST /api/webhooks/stripe': everybody,

  'POST /api/orders/find': everybody,
  'GET /api/orders/:reference': orderHolders,
  'GET /api/orders/:reference/workshops': orderHolders,
  'POST /api/orders/:reference/cancel-payment': orderHolders,
  'POST /api/orders/:reference/workshop': orderHolders,
  'POST /api/orders/:reference/self-fit': orderHolders,
  'POST /api/orders/:reference/refund': orderHolders,

  'GET /api/organisations/:orgId/bookings': workshopMembers,
  'GET /api/organisations/:orgId/bookings/:bookingId': workshopMembers,
  'POST /api/organisations/:orgId/bookings/:bookingId/accept': workshopDecides,
  'POST /api/organisations/:orgId/bookings/:bookingId/decline': workshopDecides,
  'PUT /api/organisations/:orgId/bookings/:bookingId/record': workshopMembers,
  'POST /api/organisations/:orgId/bookings/:bookingId/fitted': workshopMembers,

  'GET /api/organisations/:orgId/stock': shopMembers,
  'PATCH /api/organisations/:orgId/stock/:listingId': shopMembers,
  'GET /api/organisations/:orgId/parcels': shopMembers,
  'POST /api/organisations/:orgId/parcels/:parcelId/sent': shopMembers,
};
