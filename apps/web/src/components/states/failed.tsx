import { Box } from '@chakra-ui/react';
import type { ApiProblem } from '../../lib/api/problem';
import { Button } from '../ui/button';
import { Message } from '../ui/message';

const CURES: Record<number, string> = {
  0: 'Check the connection, then try again.',
  403: 'Your role does not allow it. Ask an administrator if it should.',
  404: 'It may have been removed, or the address is mistyped.',
};

/** What could not be shown, why, and the cure; never an empty page. */
export function Failed({
  what,
  problem,
  onRetry,
}: {
  what: string;
  problem: ApiProblem;
  onRetry?: () => void;
}) {
  return (
    <Message tone="wrong" title={`Could not show ${what}`}>
      <p>
        {problem.message} {CURES[problem.status] ?? ''}
      </p>
      {onRetry && (
        <Box mt="2">
          <Button size="sm" onClick={onRetry}>
            Try again
          </Button>
        </Box>
      )}
    </Message>
  );
}
