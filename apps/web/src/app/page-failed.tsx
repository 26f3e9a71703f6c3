import { useRouteError } from 'react-router-dom';
import { Failed } from '../components/states/failed';
import { asProblem } from '../lib/api/problem';

/** A page that broke, said as such with the cure; the frame around it stays. */
export function PageFailed() {
  return (
    <Failed what="this page" problem={asProblem(useRouteError())} onRetry={() => window.location.reload()} />
  );
}
