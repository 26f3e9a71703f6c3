import type { Language } from '../../../components/public/language';
import { StateShape } from '../../../components/ui/state-shape';
import type { PublicStatus } from '../public-status';
import { publicTime } from '../public-time';
import { STATE_CLASS, STATE_SHAPE } from '../state-class';
import { PAGE_WORDS } from '../words/page-words';

/** The answer, first and in words: what holds, until when, and when it was last looked at. */
export function Answer({ status, lang }: { status: PublicStatus; lang: Language }) {
  const { headline, untilText } = status.texts[lang];
  return (
    <section className={`answer answer-${STATE_CLASS[status.state]}`} aria-live="polite">
      <h1>
        <StateShape state={STATE_SHAPE[status.state]} size={32} />
        <span>{headline}</span>
      </h1>
      <p className="until">{untilText}</p>
      <p className="checked">
        {PAGE_WORDS[lang].checked}{' '}
        <time dateTime={status.checkedAt}>{publicTime(status.checkedAt, status.timeZone, lang)}</time>
      </p>
    </section>
  );
}
