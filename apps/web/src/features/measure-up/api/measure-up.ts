import {
  frameList,
  frameSheetView,
  linkView,
  measureUpView,
  openLinkView,
  townList,
  type MeasureUpView,
  type QuestionKey,
} from '@linkfell/contracts';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi, callApiData } from '../../../lib/api';

export const measureUpQuery = (id: string) =>
  queryOptions({
    queryKey: ['measure-up', id],
    queryFn: ({ signal }) => callApiData(`/measure-ups/${id}`, { schema: measureUpView, signal }),
    // Another tab or another device may have answered meanwhile.
    staleTime: 0,
    refetchOnWindowFocus: true,
  });

export const framesQuery = (q: string) =>
  queryOptions({
    queryKey: ['frames', q],
    queryFn: ({ signal }) => callApiData(`/frames?q=${encodeURIComponent(q)}`, { schema: frameList, signal }),
    placeholderData: (before) => before,
  });

export const frameQuery = (frameId: string) =>
  queryOptions({
    queryKey: ['frame', frameId],
    queryFn: ({ signal }) => callApiData(`/frames/${frameId}`, { schema: frameSheetView, signal }),
  });

export const townsQuery = queryOptions({
  queryKey: ['towns'],
  queryFn: ({ signal }) => callApiData('/towns', { schema: townList, signal }),
  staleTime: Infinity,
});

export const createMeasureUp = (): Promise<MeasureUpView> =>
  callApiData('/measure-ups', { method: 'POST', body: {}, schema: measureUpView });

export const openLink = (token: string) =>
  callApiData('/measure-ups/open', { method: 'POST', body: { token }, schema: openLinkView });

export const createLink = (id: string) =>
  callApiData(`/measure-ups/${id}/links`, { method: 'POST', body: {}, schema: linkView });

export const revokeLinks = (id: string) => callApi(`/measure-ups/${id}/links`, { method: 'DELETE' });

export type AnswerBody = { state: 'known'; value: unknown } | { state: 'unknown' };

/** Keeps one answer at once; the page shows what follows from it. */
export function useAnswer(id: string) {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: ({ question, answer }: { question: QuestionKey; answer: AnswerBody }) =>
      callApiData(`/measure-ups/${id}/answers/${question}`, {
        method: 'PUT',
        body: answer,
        schema: measureUpView,
      }),
    onSuccess: (view) => {
      queries.setQueryData(measureUpQuery(id).queryKey, view);
      void queries.invalidateQueries({ queryKey: ['matches', id] });
    },
  });
}
