import type { ApiList } from '../objects/stored.js';
import { invalidParam, missing } from './api-error.js';
import type { Params } from './params.js';

/** The parameters that every list takes. */
export const LIST_PARAMS = ['limit', 'starting_after', 'ending_before', 'created'] as const;

/** One page of rows that are already in the order of the list: limit 1 to 100, 10 unless told; cursors are ids. */
export function page<T extends { id: string }>(rows: T[], url: string, params: Params): ApiList<T> {
  const limit = params.whole('limit') ?? 10;
  if (limit < 1 || limit > 100) throw invalidParam('limit must be between 1 and 100.', 'limit');
  const after = params.text('starting_after');
  const before = params.text('ending_before');
  const position = (id: string, param: string): number => {
    const index = rows.findIndex((row) => row.id === id);
    if (index < 0) throw missing('object', id, param);
    return index;
  };
  if (before !== undefined) {
    const end = position(before, 'ending_before');
    const start = Math.max(0, end - limit);
    return { object: 'list', data: rows.slice(start, end), has_more: start > 0, url };
  }
  const start = after === undefined ? 0 : position(after, 'starting_after') + 1;
  return {
    object: 'list',
    data: rows.slice(start, start + limit),
    has_more: start + limit < rows.length,
    url,
  };
}

/** A test for `created`: an exact second, or any of gt, gte, lt and lte. */
export function createdWithin(params: Params): (row: { created?: number }) => boolean {
  if (!params.has('created')) return () => true;
  const range = params.child('created');
  const [gt, gte, lt, lte] = [range.whole('gt'), range.whole('gte'), range.whole('lt'), range.whole('lte')];
  if ([gt, gte, lt, lte].every((bound) => bound === undefined)) {
    const exact = params.whole('created');
    return ({ created = 0 }) => created === exact;
  }
  return ({ created = 0 }) =>
    (gt === undefined || created > gt) &&
    (gte === undefined || created >= gte) &&
    (lt === undefined || created < lt) &&
    (lte === undefined || created <= lte);
}
