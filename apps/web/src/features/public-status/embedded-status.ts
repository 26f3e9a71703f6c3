import type { PublicStatus } from './public-status';

/**
 * The answer that was served within the page, so that the first drawing has it and asks nobody. Undefined when the page
 * was reached by a link within the application, or is another district's.
 */
export function embeddedStatus(slug: string): PublicStatus | undefined {
  const found = read();
  return found && !Array.isArray(found) && found.slug === slug ? found : undefined;
}

/** The list of all districts' answers that was served within the page; undefined where there is none. */
export function embeddedList(): PublicStatus[] | undefined {
  const found = read();
  return Array.isArray(found) ? found : undefined;
}

function read(): PublicStatus | PublicStatus[] | undefined {
  const text = document.getElementById('public-status')?.textContent;
  return text ? (JSON.parse(text) as PublicStatus | PublicStatus[]) : undefined;
}
