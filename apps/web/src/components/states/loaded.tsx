import type { ReactNode } from 'react';
import type { SWRResponse } from 'swr';
import type { ApiProblem } from '../../lib/api/problem';
import { Failed } from './failed';
import { Loading } from './loading';
import { Stale } from './stale';

interface LoadedProps<T> {
  /** What `useApi` gave. */
  from: Pick<SWRResponse<T, ApiProblem>, 'data' | 'error' | 'mutate'>;
  /** What it is, for "Loading …" and "Could not show …". */
  what: string;
  /** What is shown meanwhile; three bars by default. */
  loading?: ReactNode;
  /** When the data were true, for the note that they are old. */
  since?: (data: T) => string;
  children: (data: T) => ReactNode;
}

/** The four states of a screen in one place: loading, failed with retry, stale, and there. Empty is the child's to say. */
export function Loaded<T>({ from: { data, error, mutate }, what, loading, since, children }: LoadedProps<T>) {
  if (data === undefined) {
    if (error) return <Failed what={what} problem={error} onRetry={() => void mutate()} />;
    return <>{loading ?? <Loading label={what} />}</>;
  }
  return (
    <>
      {error && <Stale since={since?.(data)} />}
      {children(data)}
    </>
  );
}
