import type { PublicText } from '../public-status';

/** What can hurt or kill while people keep warm another way; the first is said loudest. */
export function Cautions({ text, title }: { text: PublicText; title: string }) {
  const [first, ...others] = text.cautions;
  if (!first) return null;
  return (
    <section className="cautions">
      <h2>{title}</h2>
      <p>
        <strong>{first}</strong>
      </p>
      {others.map((caution) => (
        <p key={caution}>{caution}</p>
      ))}
    </section>
  );
}
