import { matchRoutes } from 'react-router-dom';
import { expect, it } from 'vitest';
import { routeList } from './route-list';
import { routeObjects } from './route-objects';

// One page must not be hidden by another one with a parameter at its place: /measure-up/open is no measure-up.
it.each(routeList.map(({ path, title, sample }) => [sample ?? path, path, title] as const))(
  'the address %s leads to the page %s',
  (address, path, title) => {
    const { route } = matchRoutes(routeObjects(), address)?.at(-1) ?? {};
    expect(route?.path).toBe(path);
    expect(route?.handle).toEqual({ title });
  },
);

it('lists no path twice', () => {
  const paths = routeList.map(({ path }) => path);
  expect(new Set(paths).size).toBe(paths.length);
});
