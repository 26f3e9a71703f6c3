import { Message } from '../ui/message';
import { ago } from '../../lib/format/time';
import { useNow } from '../../lib/clock';

/** What is shown is no longer fresh: since when, and that it is being asked again. Old numbers are never shown as new. */
export function Stale({ since }: { since: string | undefined }) {
  const now = useNow();
  return (
    <Message tone="warn" title="Not up to date">
      The service does not answer; what you see is {since ? `from ${ago(since, now)}` : 'old'}. It is being
      asked again every few seconds.
    </Message>
  );
}
