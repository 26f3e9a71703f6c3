import { Link } from 'react-router-dom';
import { inLanguage, type Language } from '../../../components/public/language';
import type { PublicStatus } from '../public-status';
import { PAGE_WORDS } from '../words/page-words';
import { Answer } from './answer';
import { Cautions } from './cautions';
import { SmokeNow } from './smoke-now';
import { StoveQuestion } from './stove-question';
import { Why } from './why';

/** A district's page, in the order in which a resident needs it: answer, my stove, what to do, why, smoke, cautions. */
export function DistrictAnswer({ status, lang }: { status: PublicStatus; lang: Language }) {
  const words = PAGE_WORDS[lang];
  const text = status.texts[lang];
  return (
    <>
      <Answer status={status} lang={lang} />
      <div className="public-body">
        <StoveQuestion text={text} legend={words.myStove} />
        {text.exemptions && <p className="exemptions">{text.exemptions}</p>}
        {text.whatToDo.length > 0 && (
          <section className="to-do">
            <h2>{words.whatToDo}</h2>
            <ul>
              {text.whatToDo.map((item) => (
                <li key={item}>{item}</li>
              ))}
            </ul>
          </section>
        )}
        <Why status={status} lang={lang} />
        <SmokeNow status={status} lang={lang} />
        <Cautions text={text} title={words.staySafe} />
        <p>
          <Link
            className="button button-go button-wide"
            to={inLanguage(`/subscribe?district=${status.slug}`, lang)}
          >
            {words.tellMe}
          </Link>
        </p>
      </div>
    </>
  );
}
