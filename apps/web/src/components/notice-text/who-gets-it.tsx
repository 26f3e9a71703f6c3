import type { NoticePreview } from '../../lib/api/types';
import { count, counted } from '../../lib/format/number';

/** To how many people, by which ways, in a sentence. */
export function WhoGetsIt({ recipients }: { recipients: NoticePreview['recipients'] }) {
  return (
    <>
      Goes to <strong>{counted(recipients.people, 'person', 'people')}</strong>: {count(recipients.texts)}{' '}
      {recipients.texts === 1 ? 'text' : 'texts'}, {counted(recipients.emails, 'mail')}. The public page
      changes at once.
    </>
  );
}
