import type { Act, Kind } from './api/types';

/** The kinds of notice in words. */
export const KIND_NAME: Record<Kind, string> = { advisory: 'Advisory', burnBan: 'Burn ban' };

/** The kind in the middle of a sentence: "the burn ban". */
export const kindInSentence = (kind: Kind): string => KIND_NAME[kind].toLowerCase();

/** What is proposed, as a question to the person who decides: "End the burn ban in Mill Flats?" */
export function proposalQuestion(card: { kind: Kind; act: Act; districtName: string }): string {
  if (card.act === 'end') return `End the ${kindInSentence(card.kind)} in ${card.districtName}?`;
  return `${card.kind === 'burnBan' ? 'Burn ban' : 'Advisory'} for ${card.districtName}?`;
}
