import { Link } from 'react-router-dom';
import { inLanguage, type Language } from '../../../components/public/language';
import { PublicMessage } from '../../../components/public/public-message';
import { useAct } from '../../../lib/use-act';
import { confirmAddress } from '../api';
import { SUBSCRIPTION_WORDS } from '../words';
import { useState } from 'react';

/** Confirms an address when the button is pressed: opening the link alone, as mail scanners do, confirms nothing. */
export function ConfirmAddress({ token, lang }: { token: string; lang: Language }) {
  const words = SUBSCRIPTION_WORDS[lang];
  const [manageToken, setManageToken] = useState<string>();
  const { run, busy, problem } = useAct(confirmAddress);
  const confirm = async () => setManageToken((await run(token))?.manageToken);

  if (manageToken !== undefined) {
    return (
      <div role="status">
        <h1>{words.confirmedTitle}</h1>
        <p>{words.confirmed}</p>
        <p>
          <Link to={inLanguage(`/s/${manageToken}`, lang)}>{words.toMine}</Link>
        </p>
      </div>
    );
  }
  return (
    <>
      <h1>{words.confirmTitle}</h1>
      <p>{words.confirmLead}</p>
      {problem && (
        <PublicMessage wrong>
          <p>{problem.message}</p>
          <p>
            <Link to={inLanguage('/subscribe', lang)}>{words.again}</Link>
          </p>
        </PublicMessage>
      )}
      <p>
        <button className="button-go button-wide" onClick={() => void confirm()} disabled={busy}>
          {words.confirm}
        </button>
      </p>
    </>
  );
}
