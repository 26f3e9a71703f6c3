import { Message } from '../ui/message';
import type { ApiProblem } from '../../lib/api/problem';

const MEANWHILE = new Set(['already-done', 'changed-meanwhile', 'not-possible-now']);

/** Whether the refusal means that somebody else was quicker. */
export const isDecidedMeanwhile = (problem: ApiProblem | undefined): boolean =>
  problem !== undefined && MEANWHILE.has(problem.code);

/** Why an act was refused. When somebody was quicker: what they did, and that what was typed is still there. */
export function Refusal({ problem }: { problem: ApiProblem | undefined }) {
  if (!problem) return null;
  if (isDecidedMeanwhile(problem)) {
    return (
      <Message tone="warn" title={problem.message}>
        Nothing was done twice. What you typed is still here.
      </Message>
    );
  }
  return (
    <Message tone="wrong" title="It was not done">
      {problem.message}
    </Message>
  );
}
