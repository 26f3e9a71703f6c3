import { useEffect, useState } from 'react';
import type { Mapping, Proposal } from './types';

const keyOf = (uploadId: number): string => `lidwatch.mapping.${uploadId}`;

const kept = (uploadId: number): Mapping | undefined => {
  const text = sessionStorage.getItem(keyOf(uploadId));
  return text === null ? undefined : (JSON.parse(text) as Mapping);
};

/**
 * The mapping as the person has it now: the proposal until something is corrected. Kept for this upload while the
 * window is open, so that a reload or the way back loses nothing.
 */
export function useMappingDraft(uploadId: number, proposal: Proposal) {
  const [draft, setDraft] = useState<Mapping>(() => {
    const before = kept(uploadId);
    return before && before.sheet === proposal.mapping.sheet ? before : proposal.mapping;
  });
  useEffect(() => {
    sessionStorage.setItem(keyOf(uploadId), JSON.stringify(draft));
  }, [uploadId, draft]);
  return { draft, setDraft, reset: () => setDraft(proposal.mapping) };
}
