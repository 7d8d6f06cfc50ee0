import { pageRoutes } from './routes';

/** The pages as plain data, for tests that visit each of them: a page without a visit fails there. */
export const routeList = pageRoutes.map(({ path, title, prerendered = false }) => ({
  path,
  title,
  prerendered,
}));
