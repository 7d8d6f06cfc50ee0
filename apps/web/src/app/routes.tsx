import type { ComponentType } from 'react';
import { routeList, type PageEntry, type PagePath } from './route-list';

type FetchPage = () => Promise<ComponentType>;

/** The code of each page, fetched when somebody goes there. */
const pages: Record<PagePath, FetchPage> = {
  '/': () => import('../features/front/front-page').then((module) => module.FrontPage),
  '/terms': () => import('../features/company/terms-page').then((module) => module.TermsPage),
  '/privacy': () => import('../features/company/privacy-page').then((module) => module.PrivacyPage),
  '/returns': () => import('../features/company/returns-page').then((module) => module.ReturnsPage),
  '/contact': () => import('../features/company/contact-page').then((module) => module.ContactPage),
  '/help': () => import('../features/help/pages/help-index-page').then((module) => module.HelpIndexPage),
  '/help/eye-to-eye': () =>
    import('../features/help/pages/eye-to-eye-page').then((module) => module.EyeToEyePage),
  '/help/stroke-is-not-travel': () =>
    import('../features/help/pages/stroke-page').then((module) => module.StrokePage),
  '/help/trunnion': () =>
    import('../features/help/pages/trunnion-page').then((module) => module.TrunnionPage),
  '/help/hardware': () =>
    import('../features/help/pages/hardware-page').then((module) => module.HardwarePage),
  '/help/air-or-coil': () =>
    import('../features/help/pages/air-or-coil-page').then((module) => module.AirOrCoilPage),
  '/help/reservoir': () =>
    import('../features/help/pages/reservoir-page').then((module) => module.ReservoirPage),
  '/help/remote': () => import('../features/help/pages/remote-page').then((module) => module.RemotePage),
  '/shocks': () => import('../features/catalogue/shocks-page').then((module) => module.ShocksPage),
  '/shocks/sizes/:sizeKey': () => import('../features/catalogue/size-page').then((module) => module.SizePage),
  '/shocks/:sizeId': () => import('../features/catalogue/shock-page').then((module) => module.ShockPage),
  '/workshops': () => import('../features/workshops/workshops-page').then((module) => module.WorkshopsPage),
  '/workshops/:workshopId': () =>
    import('../features/workshops/workshop-page').then((module) => module.WorkshopPage),
  '/measure-up': () => import('../features/measure-up/start-page').then((module) => module.StartPage),
  '/measure-up/open': () => import('../features/measure-up/open-page').then((module) => module.OpenPage),
  '/measure-up/:id/matches': () =>
    import('../features/matches/matches-page').then((module) => module.MatchesPage),
  '/measure-up/:id/matches/:sizeId': () =>
    import('../features/matches/match-page').then((module) => module.MatchPage),
  '/measure-up/:id/matches/:sizeId/curves': () =>
    import('../features/curves/curves-page').then((module) => module.CurvesPage),
  '/measure-up/:id/matches/:sizeId/clearance': () =>
    import('../features/clearance/clearance-page').then((module) => module.ClearancePage),
  '/measure-up/:id/:question': () =>
    import('../features/measure-up/question-page').then((module) => module.QuestionPage),
  '/plans/:planId': () => import('../features/plans/plan-page').then((module) => module.PlanPage),
  '/orders/:reference': () => import('../features/orders/order-page').then((module) => module.OrderPage),
  '/find-order': () => import('../features/orders/find-order-page').then((module) => module.FindOrderPage),
  '/sign-in': () => import('../features/auth/sign-in-page').then((module) => module.SignInPage),
  '/forgotten-password': () =>
    import('../features/auth/forgotten-password-page').then((module) => module.ForgottenPasswordPage),
  '/reset-password': () =>
    import('../features/auth/reset-password-page').then((module) => module.ResetPasswordPage),
  '/desk': () => import('../features/desk/desk-page').then((module) => module.DeskPage),
  '/desk/:orgId/stock': () => import('../features/desk/stock-page').then((module) => module.StockPage),
  '/desk/:orgId/parcels': () => import('../features/desk/parcels-page').then((module) => module.ParcelsPage),
  '/desk/:orgId/bookings': () =>
    import('../features/desk/bookings-page').then((module) => module.BookingsPage),
  '/desk/:orgId/bookings/:bookingId': () =>
    import('../features/desk/job-sheet-page').then((module) => module.JobSheetPage),
};

export interface PageRoute extends PageEntry<PagePath> {
  page: FetchPage;
}

/** The route list with the code of every page. */
export const pageRoutes: readonly PageRoute[] = routeList.map((entry) => ({
  ...entry,
  page: pages[entry.path],
}));
