/** What a page may load before it can be used, KB (1000 bytes) of JavaScript after gzip. */
export const budgetsKb = { front: 170, measuring: 270, other: 320 } as const;

export interface PageEntry<Path extends string = string> {
  /** A React Router path, absolute. */
  path: Path;
  /** What the document title says before "– Linkfell", until the page knows better. */
  title: string;
  budget: keyof typeof budgetsKb;
  /** The address that page walks visit, where it is not the path; they fill what still begins with a colon. */
  sample?: string;
  /** Written as HTML at build time: only for pages that show the same to everybody. */
  prerendered?: true;
}

/** A new page is a line here and one in routes.tsx, which does not compile while it is missing. */
const entries = [
  { path: '/', title: 'Find the rear shock that fits', budget: 'front', prerendered: true },
  { path: '/terms', title: 'Terms', budget: 'front', prerendered: true },
  { path: '/privacy', title: 'Privacy', budget: 'front', prerendered: true },
  { path: '/returns', title: 'Returns and refunds', budget: 'front', prerendered: true },
  { path: '/contact', title: 'Contact', budget: 'front', prerendered: true },
  { path: '/help', title: 'Help', budget: 'front', prerendered: true },
  { path: '/help/eye-to-eye', title: 'What is eye-to-eye?', budget: 'front', prerendered: true },
  { path: '/help/stroke-is-not-travel', title: 'Stroke is not travel', budget: 'front', prerendered: true },
  { path: '/help/trunnion', title: 'What is a trunnion?', budget: 'front', prerendered: true },
  { path: '/help/hardware', title: 'What is mounting hardware?', budget: 'front', prerendered: true },
  { path: '/help/air-or-coil', title: 'Air or coil?', budget: 'front', prerendered: true },
  { path: '/help/reservoir', title: 'What is a reservoir for?', budget: 'front', prerendered: true },
  { path: '/help/remote', title: 'What does a remote do?', budget: 'front', prerendered: true },
  { path: '/shocks', title: 'Shocks by size', budget: 'measuring' },
  {
    path: '/shocks/sizes/:sizeKey',
    title: 'Shocks of one size',
    budget: 'measuring',
    sample: '/shocks/sizes/210x50',
  },
  {
    path: '/shocks/:sizeId',
    title: 'One shock',
    budget: 'measuring',
    sample: '/shocks/vellacott-tarn-210x50',
  },
  { path: '/workshops', title: 'Workshops', budget: 'measuring' },
  {
    path: '/workshops/:workshopId',
    title: 'One workshop',
    budget: 'measuring',
    sample: '/workshops/tin-shed',
  },
  { path: '/measure-up', title: 'Measure-up', budget: 'measuring' },
  { path: '/measure-up/open', title: 'Your link', budget: 'measuring' },
  { path: '/measure-up/:id/matches', title: 'Fitting sheet', budget: 'measuring' },
  { path: '/measure-up/:id/matches/:sizeId', title: 'One shock', budget: 'measuring' },
  { path: '/measure-up/:id/matches/:sizeId/curves', title: 'Curves', budget: 'measuring' },
  { path: '/measure-up/:id/matches/:sizeId/clearance', title: 'Room in the frame', budget: 'measuring' },
  {
    path: '/measure-up/:id/:question',
    title: 'Measure-up',
    budget: 'measuring',
    sample: '/measure-up/:id/eye-to-eye',
  },
  { path: '/plans/:planId', title: 'Plan', budget: 'other' },
  { path: '/orders/:reference', title: 'Order', budget: 'other' },
  { path: '/find-order', title: 'Find my order', budget: 'other' },
  { path: '/sign-in', title: 'Sign in', budget: 'other' },
  { path: '/forgotten-password', title: 'Forgotten password', budget: 'other' },
  {
    path: '/reset-password',
    title: 'New password',
    budget: 'other',
    sample: '/reset-password#0123456789abcdef0123456789abcdef',
  },
  { path: '/desk', title: 'Your desk', budget: 'other' },
  { path: '/desk/:orgId/stock', title: 'Stock', budget: 'other' },
  { path: '/desk/:orgId/parcels', title: 'Parcels', budget: 'other' },
  { path: '/desk/:orgId/bookings', title: 'Fittings', budget: 'other' },
  { path: '/desk/:orgId/bookings/:bookingId', title: 'Job sheet', budget: 'other' },
] as const satisfies readonly PageEntry[];

export type PagePath = (typeof entries)[number]['path'];

/** Every page as plain data: titles, budgets, prerendering and the walks through all pages are made from it. */
export const routeList: readonly PageEntry<PagePath>[] = entries;
