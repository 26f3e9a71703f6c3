import useSWR from 'swr';
import { api } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import type { Me } from '../../lib/api/types';

/** What somebody signs in with. */
export interface Credentials {
  email: string;
  password: string;
}

/** What a one-time link is for, and whose it is. */
export interface LinkView {
  purpose: 'first-administrator' | 'invitation' | 'password';
  email?: string;
  name?: string;
}

/** Signs somebody in. */
export const signIn = (credentials: Credentials) => api.post<Me>('/api/auth/sign-in', credentials);

/** Makes the first administrator and signs them in. */
export const makeFirstAdministrator = (entries: Credentials & { token: string; name: string }) =>
  api.post<Me>('/api/auth/first-administrator', entries);

/** Sets the password of whoever the link was made for, and signs them in. */
export const acceptInvitation = (entries: { token: string; password: string }) =>
  api.post<Me>('/api/auth/invitations/accept', entries);

/** What a link is for; looking does not use it up. */
export const useLink = (token: string) =>
  useSWR<LinkView, ApiProblem>(
    `/api/auth/link/${encodeURIComponent(token)}`,
    (path: string) => api.get<LinkView>(path),
    { revalidateOnFocus: false, shouldRetryOnError: false },
  );
