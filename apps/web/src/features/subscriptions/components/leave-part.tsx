import { useState } from 'react';
import type { Language } from '../../../components/public/language';
import { PublicMessage } from '../../../components/public/public-message';
import { useAct } from '../../../lib/use-act';
import { leave } from '../api';
import { SUBSCRIPTION_WORDS } from '../words';

interface LeavePartProps {
  token: string;
  lang: Language;
  onLeft: () => void;
}

/** The way out: what will happen, then one question, then it is done. */
export function LeavePart({ token, lang, onLeft }: LeavePartProps) {
  const words = SUBSCRIPTION_WORDS[lang];
  const [asked, setAsked] = useState(false);
  const { run, busy, problem } = useAct(async (of: string) => {
    await leave(of);
    onLeft();
  });
  return (
    <section>
      <h2>{words.leaveTitle}</h2>
      <p>{words.leaveLead}</p>
      {problem && <PublicMessage wrong>{problem.message}</PublicMessage>}
      {asked ? (
        <div role="group" aria-label={words.leaveSure} className="leave-question">
          <p>
            <strong>{words.leaveSure}</strong>
          </p>
          <button onClick={() => void run(token)} disabled={busy} autoFocus>
            {words.leaveYes}
          </button>{' '}
          <button onClick={() => setAsked(false)} disabled={busy}>
            {words.leaveNo}
          </button>
        </div>
      ) : (
        <p>
          <button onClick={() => setAsked(true)}>{words.leave}</button>
        </p>
      )}
    </section>
  );
}
