import { AirColumn } from '../../../components/air-column/air-column';
import type { Language } from '../../../components/public/language';
import type { PublicStatus } from '../public-status';
import { PAGE_WORDS } from '../words/page-words';

/** Why it is so, in a few words, with the air column beside them where the mast has spoken. */
export function Why({ status, lang }: { status: PublicStatus; lang: Language }) {
  const { levels, inversion } = status;
  const lid =
    inversion?.surface === 'present' && inversion.topM !== null
      ? { topM: inversion.topM, open: inversion.open }
      : null;
  return (
    <section className="why">
      <div className="why-card">
        {levels && levels.length > 1 && (
          <AirColumn size="medium" levels={levels} lid={lid} known={inversion?.surface !== 'not known'} />
        )}
        <div>
          <h2>{PAGE_WORDS[lang].why}</h2>
          <p>{status.texts[lang].why}</p>
        </div>
      </div>
    </section>
  );
}
