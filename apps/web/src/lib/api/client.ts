import { ApiProblem, unreachable } from './problem';
import { announceSessionEnded } from './session-ended';

async function request<T>(method: string, path: string, body?: unknown): Promise<T> {
  const response = await fetch(path, {
    method,
    credentials: 'same-origin',
    headers: {
      accept: 'application/json',
      ...(body === undefined ? {} : { 'content-type': 'application/json' }),
    },
    body: body === undefined ? undefined : JSON.stringify(body),
  }).catch(() => {
    throw unreachable();
  });
  const text = await response.text();
  const isJson = (response.headers.get('content-type') ?? '').includes('json');
  const answer: unknown = isJson && text !== '' ? JSON.parse(text) : {};
  if (response.ok) return answer as T;
  const problem = new ApiProblem(response.status, answer as object);
  if (problem.code === 'sign-in-needed') announceSessionEnded();
  throw problem;
}

/** Requests to the service's own API. Each throws an `ApiProblem` when it is refused or cannot be reached. */
export const api = {
  get: <T>(path: string) => request<T>('GET', path),
  post: <T>(path: string, body: unknown = {}) => request<T>('POST', path, body),
  patch: <T>(path: string, body: unknown) => request<T>('PATCH', path, body),
  put: <T>(path: string, body: unknown) => request<T>('PUT', path, body),
  remove: <T>(path: string) => request<T>('DELETE', path),
};

/**
 * A path with its query; what is undefined or empty is left out.
 *
 * Valid: values that read well as text. Example: `withQuery('/api/notices', { page: 2 })`.
 */
export function withQuery(path: string, query: Record<string, string | number | undefined>): string {
  const entries = Object.entries(query).filter(([, value]) => value !== undefined && value !== '');
  const search = new URLSearchParams(entries.map(([key, value]) => [key, String(value)])).toString();
  return search === '' ? path : `${path}?${search}`;
}
