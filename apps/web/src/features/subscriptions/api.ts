import useSWR from 'swr';
import { api } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import type { SubscriptionRequest, SubscriptionView, Wishes } from './subscription';

const ROOT = '/api/public/subscriptions';
const ofToken = (token: string) => `${ROOT}/${encodeURIComponent(token)}`;

/** Asks to be told next time. */
export const subscribe = (request: SubscriptionRequest) => api.post<{ message: string }>(ROOT, request);

/** Confirms an address by its link's token; gives the token of the page on which wishes are changed. */
export const confirmAddress = (token: string) =>
  api.post<{ manageToken: string }>(`${ROOT}/confirm`, { token });

/** A subscriber's own wishes. */
export const useSubscription = (token: string) =>
  useSWR<SubscriptionView, ApiProblem>(ofToken(token), (path: string) => api.get<SubscriptionView>(path), {
    revalidateOnFocus: false,
    shouldRetryOnError: false,
  });

/** Changes a subscriber's wishes. */
export const changeWishes = (token: string, wishes: Wishes) =>
  api.patch<SubscriptionView>(ofToken(token), wishes);

/** Ends a subscription. */
export const leave = (token: string) => api.post<void>(`${ofToken(token)}/leave`);
