import { useEffect, useState } from 'react';
import type { Mapping, Proposal } from './types';

/** What a person has made of a file so far: how it is read, and what was answered, by the question's id. */
interface Kept {
  mapping: Mapping;
  answers: Record<string, string>;
}

const keyOf = (uploadId: number): string => `lidwatch.mapping.${uploadId}`;

const kept = (uploadId: number): Kept | undefined => {
  const text = sessionStorage.getItem(keyOf(uploadId));
  return text === null ? undefined : (JSON.parse(text) as Kept);
};

/**
 * The mapping as the person has it now: the proposal until something is corrected. Kept for this upload with the
 * answers given while the window is open, so that a reload or the way back loses nothing.
 */
export function useMappingDraft(uploadId: number, proposal: Proposal) {
  const found: Kept = { mapping: proposal.mapping, answers: {} };
  const [now, setNow] = useState<Kept>(() => {
    const before = kept(uploadId);
    return before && before.mapping.sheet === proposal.mapping.sheet ? before : found;
  });
  useEffect(() => {
    sessionStorage.setItem(keyOf(uploadId), JSON.stringify(now));
  }, [uploadId, now]);
  return {
    draft: now.mapping,
    answers: now.answers,
    setDraft: (mapping: Mapping) => setNow((before) => ({ ...before, mapping })),
    setAnswers: (answers: Kept['answers']) => setNow((before) => ({ ...before, answers })),
    reset: () => setNow(found),
  };
}
