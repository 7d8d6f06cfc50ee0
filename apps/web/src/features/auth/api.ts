import { meView, type ResetConfirmBody, type ResetRequestBody, type SignInBody } from '@linkfell/contracts';
import { queryOptions } from '@tanstack/react-query';
import { callApi, callApiData } from '../../lib/api';

export const meQuery = queryOptions({
  queryKey: ['me'],
  queryFn: ({ signal }) => callApiData('/auth/me', { schema: meView, signal }),
});
export const signIn = (body: SignInBody) =>
  callApiData('/auth/sign-in', { method: 'POST', body, schema: meView });
export const signOut = () => callApi('/auth/sign-out', { method: 'POST', body: {} });
export const askReset = (body: ResetRequestBody) => callApi('/auth/password-reset', { method: 'POST', body });
export const confirmReset = (body: ResetConfirmBody) =>
  callApi('/auth/password-reset/confirm', { method: 'POST', body });
