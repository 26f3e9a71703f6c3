import useSWR from 'swr';
import { api, withQuery } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import type { NoticeDetail, NoticePreview, Page, ProposalCard, ProposalDetail } from '../../lib/api/types';
import { useApi } from '../../lib/api/use-api';

const at = (id: number) => `/api/proposals/${id}`;

/** One proposal with its evidence, kept fresh: somebody else may decide meanwhile. */
export const useProposal = (id: number) => useApi<ProposalDetail>(at(id), { live: true });

/** The proposals in a state, newest first. */
export const useProposals = (state: string) =>
  useApi<Page<ProposalCard>>(withQuery('/api/proposals', { state }), { live: true });

/** The notice exactly as it would go out, ending at `expiresAt` (the rule's longest when not given). */
export const usePreview = (id: number, version: number, expiresAt: string | undefined) =>
  useSWR<NoticePreview, ApiProblem>(
    [`${at(id)}/preview`, version, expiresAt],
    () => api.post<NoticePreview>(`${at(id)}/preview`, { expiresAt }),
    { keepPreviousData: true, revalidateOnFocus: false, shouldRetryOnError: false },
  );

/** Tells the officer that the evidence stands, with a sentence of why. */
export const confirmProposal = (id: number, body: { note: string; version: number }) =>
  api.post<ProposalDetail>(`${at(id)}/confirm`, body);

/** Lays it aside, with the reason. */
export const declineProposal = (id: number, body: { reason: string; version: number }) =>
  api.post<ProposalDetail>(`${at(id)}/decline`, body);

/** Gives it back to the analyst, with the reason. */
export const returnProposal = (id: number, body: { reason: string; version: number }) =>
  api.post<ProposalDetail>(`${at(id)}/return`, body);

/** What issuing needs besides the proposal. */
export interface IssueInput {
  previewHash: string;
  version: number;
  expiresAt?: string;
  password?: string;
  requestKey: string;
}

/** Issues the previewed notice, or ends the one in force. The same key does it once. */
export const issueProposal = (id: number, body: IssueInput) =>
  api.post<NoticeDetail>(`${at(id)}/issue`, body);
