import { useEffect, useRef } from 'react';
import type { Language } from '../../../components/public/language';
import { SUBSCRIPTION_WORDS } from '../words';

interface LookForTheLinkProps {
  lang: Language;
  byMail: boolean;
  byText: boolean;
  onBack: () => void;
}

/** What comes next after the form: a link in the mail or on the phone. The same words whether the address was known. */
export function LookForTheLink({ lang, byMail, byText, onBack }: LookForTheLinkProps) {
  const words = SUBSCRIPTION_WORDS[lang];
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <>
      <h1 ref={heading} tabIndex={-1}>
        {words.sentTitle}
      </h1>
      {byMail && <p>{words.sentMail}</p>}
      {byText && <p>{words.sentPhone}</p>}
      <p className="mute">{words.sentWhy}</p>
      <p>
        <button type="button" onClick={onBack}>
          {words.another}
        </button>
      </p>
    </>
  );
}
