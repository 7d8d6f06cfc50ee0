import type { ComponentType } from 'react';

/** One page. The list of them is what the router, the titles, the prerendering and the page walks are made from. */
export interface PageRoute {
  /** A React Router path, absolute. */
  path: string;
  /** What the document title says before "– Linkfell", until the page knows better. */
  title: string;
  page: () => Promise<ComponentType>;
  /** Written as HTML at build time: only for pages that show the same to everybody. */
  prerendered?: true;
}

export const pageRoutes: PageRoute[] = [
  {
    path: '/',
    title: 'Find the rear shock that fits',
    page: () => import('../features/front/front-page').then((module) => module.FrontPage),
    prerendered: true,
  },
  {
    path: '/terms',
    title: 'Terms',
    page: () => import('../features/company/terms-page').then((module) => module.TermsPage),
    prerendered: true,
  },
  {
    path: '/privacy',
    title: 'Privacy',
    page: () => import('../features/company/privacy-page').then((module) => module.PrivacyPage),
    prerendered: true,
  },
  {
    path: '/returns',
    title: 'Returns and refunds',
    page: () => import('../features/company/returns-page').then((module) => module.ReturnsPage),
    prerendered: true,
  },
  {
    path: '/contact',
    title: 'Contact',
    page: () => import('../features/company/contact-page').then((module) => module.ContactPage),
    prerendered: true,
  },
  {
    path: '/measure-up',
    title: 'Measure-up',
    page: () => import('../features/measure-up/start-page').then((module) => module.StartPage),
  },
  {
    path: '/measure-up/open',
    title: 'Your link',
    page: () => import('../features/measure-up/open-page').then((module) => module.OpenPage),
  },
  {
    path: '/measure-up/:id/matches',
    title: 'Fitting sheet',
    page: () => import('../features/matches/matches-page').then((module) => module.MatchesPage),
  },
  {
    path: '/measure-up/:id/matches/:sizeId',
    title: 'One shock',
    page: () => import('../features/matches/match-page').then((module) => module.MatchPage),
  },
  {
    path: '/measure-up/:id/:question',
    title: 'Measure-up',
    page: () => import('../features/measure-up/question-page').then((module) => module.QuestionPage),
  },
  {
    path: '/plans/:planId',
    title: 'Plan',
    page: () => import('../features/plans/plan-page').then((module) => module.PlanPage),
  },
  {
    path: '/orders/:reference',
    title: 'Order',
    page: () => import('../features/orders/order-page').then((module) => module.OrderPage),
  },
  {
    path: '/find-order',
    title: 'Find my order',
    page: () => import('../features/orders/find-order-page').then((module) => module.FindOrderPage),
  },
  {
    path: '/sign-in',
    title: 'Sign in',
    page: () => import('../features/auth/sign-in-page').then((module) => module.SignInPage),
  },
  {
    path: '/forgotten-password',
    title: 'Forgotten password',
    page: () =>
      import('../features/auth/forgotten-password-page').then((module) => module.ForgottenPasswordPage),
  },
  {
    path: '/reset-password',
    title: 'New password',
    page: () => import('../features/auth/reset-password-page').then((module) => module.ResetPasswordPage),
  },
  {
    path: '/desk',
    title: 'Your desk',
    page: () => import('../features/desk/desk-page').then((module) => module.DeskPage),
  },
  {
    path: '/desk/:orgId/stock',
    title: 'Stock',
    page: () => import('../features/desk/stock-page').then((module) => module.StockPage),
  },
  {
    path: '/desk/:orgId/parcels',
    title: 'Parcels',
    page: () => import('../features/desk/parcels-page').then((module) => module.ParcelsPage),
  },
  {
    path: '/desk/:orgId/bookings',
    title: 'Fittings',
    page: () => import('../features/desk/bookings-page').then((module) => module.BookingsPage),
  },
  {
    path: '/desk/:orgId/bookings/:bookingId',
    title: 'Job sheet',
    page: () => import('../features/desk/job-sheet-page').then((module) => module.JobSheetPage),
  },
];
