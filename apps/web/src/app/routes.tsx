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
];
