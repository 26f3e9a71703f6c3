import type { PublicText } from '../public-status';
import { useMyStove } from '../use-my-stove';

/** "My stove is…": each kind of burning has its answer; on paper all of them are printed. */
export function StoveQuestion({ text, legend }: { text: PublicText; legend: string }) {
  const [mine, choose] = useMyStove(text.stoves.map(({ kind }) => kind));
  if (text.stoves.length === 0) return null;
  return (
    <fieldset className="stove">
      <legend>{legend}</legend>
      <div className="stove-choices">
        {text.stoves.map(({ kind, name }) => (
          <label key={kind}>
            <input
              type="radio"
              name="stove"
              value={kind}
              checked={kind === mine}
              onChange={() => choose(kind)}
            />
            <span>{name}</span>
          </label>
        ))}
      </div>
      <div aria-live="polite">
        {text.stoves.map(({ kind, name, text: answer }) => (
          <p key={kind} className="stove-answer" data-stove={kind}>
            <strong className="print-only">{name}: </strong>
            {answer}
          </p>
        ))}
      </div>
    </fieldset>
  );
}
