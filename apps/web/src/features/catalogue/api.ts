import { shockList, shockPage, shockSizeList } from '@linkfell/contracts';
import { queryOptions } from '@tanstack/react-query';
import { callApiData } from '../../lib/api';

/** What narrows the lists, as it stands in the address. */
export interface Narrowing {
  spring: 'air' | 'coil' | 'either';
  reservoir: 'with' | 'without' | 'either';
}

const springs = ['air', 'coil', 'either'] as const;
const reservoirs = ['with', 'without', 'either'] as const;

/** Reads the address; what is no word of ours counts as "either". */
export const narrowingOf = (search: URLSearchParams): Narrowing => ({
  spring: springs.find((word) => word === search.get('spring')) ?? 'either',
  reservoir: reservoirs.find((word) => word === search.get('reservoir')) ?? 'either',
});

const asked = (words: Record<string, string>): string => {
  const search = new URLSearchParams(
    Object.entries(words).filter(([, value]) => value !== 'either'),
  ).toString();
  return search === '' ? '' : `?${search}`;
};

export const sizesQuery = (narrowing: Narrowing) =>
  queryOptions({
    queryKey: ['shocks', 'sizes', narrowing],
    queryFn: ({ signal }) =>
      callApiData(`/shocks/sizes${asked({ ...narrowing })}`, { schema: shockSizeList, signal }),
    placeholderData: (before) => before,
  });

export const shocksQuery = (words: Narrowing & ({ size: string } | { q: string })) =>
  queryOptions({
    queryKey: ['shocks', 'list', words],
    queryFn: ({ signal }) => callApiData(`/shocks${asked({ ...words })}`, { schema: shockList, signal }),
    placeholderData: (before) => before,
  });

export const shockQuery = (sizeId: string) =>
  queryOptions({
    queryKey: ['shocks', 'page', sizeId],
    queryFn: ({ signal }) =>
      callApiData(`/shocks/${encodeURIComponent(sizeId)}`, { schema: shockPage, signal }),
  });
