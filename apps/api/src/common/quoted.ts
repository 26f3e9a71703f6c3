const SHOWN_CHARACTERS = 40;

/** A text of unknown origin for use within a sentence: in quotation marks, shortened, without control characters. */
export const quoted = (text: string): string => {
  const shown = text.length > SHOWN_CHARACTERS ? `${text.slice(0, SHOWN_CHARACTERS)}…` : text;
  return `"${shown.replace(/\p{Cc}/gu, '?')}"`;
};
