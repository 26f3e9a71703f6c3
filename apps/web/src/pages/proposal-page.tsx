import { useParams } from 'react-router-dom';
import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { Loading } from '../components/states/loading';
import { useProposal } from '../features/proposals/api';
import { ProposalView } from '../features/proposals/components/proposal-view';
import { useZone } from '../lib/api/use-districts';
import { useMe } from '../lib/api/use-me';
import { dayAndTime } from '../lib/format/time';
import { proposalQuestion } from '../lib/words';

/** One proposal, for the analyst and for the officer. */
export function ProposalPage() {
  const id = Number(useParams().id);
  const proposal = useProposal(id);
  const zone = useZone(proposal.data?.districtId);
  const { me } = useMe();
  return (
    <>
      <PageHead
        title={proposal.data ? proposalQuestion(proposal.data) : 'Proposal'}
        aside={proposal.data && `opened ${dayAndTime(proposal.data.openedAt, zone)}`}
      />
      <Loaded
        from={proposal}
        what="the proposal"
        loading={<Loading label="the proposal" rows={3} rowHeight="40" />}
      >
        {(data) =>
          me && (
            <ProposalView
              key={id}
              proposal={data}
              me={me}
              zone={zone}
              onAnswer={() => void proposal.mutate()}
            />
          )
        }
      </Loaded>
    </>
  );
}
