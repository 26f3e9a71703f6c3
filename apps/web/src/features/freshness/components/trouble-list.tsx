import { paths } from '../../../app/paths';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { PlainTable } from '../../../components/ui/plain-table';
import { TextLink } from '../../../components/ui/text-link';
import { AgoText, InstantText } from '../../../components/ui/time-text';
import { useTroubles } from '../api';
import { KIND_WORDS, toldWords } from '../words';

/** How many troubles that are over are still shown. */
const PAST = 5;

/** What is wrong with the towers' data, since when, and who was told; below it what lately was. */
export function TroubleList({ zone }: { zone: string }) {
  return (
    <Loaded from={useTroubles()} what="the troubles">
      {(troubles) => {
        const open = troubles.filter(({ endedAt }) => endedAt === null);
        const past = troubles.filter(({ endedAt }) => endedAt !== null).slice(0, PAST);
        if (open.length + past.length === 0)
          return <Empty title="No tower is in trouble">A late or wrong-clocked tower is shown here.</Empty>;
        return (
          <PlainTable
            caption="Troubles"
            rows={[...open, ...past]}
            keyOf={({ id }) => id}
            columns={[
              {
                head: 'Tower',
                cell: ({ towerId, towerName }) => (
                  <TextLink to={paths.towerReadings(towerId)}>{towerName}</TextLink>
                ),
              },
              {
                head: 'Trouble',
                cell: ({ kind, endedAt }) =>
                  endedAt ? KIND_WORDS[kind] : <strong>{KIND_WORDS[kind]}</strong>,
              },
              { head: 'Since', cell: ({ since }) => <InstantText at={since} zone={zone} /> },
              {
                head: 'State',
                cell: ({ endedAt }) =>
                  endedAt ? (
                    <>
                      over <AgoText at={endedAt} zone={zone} />
                    </>
                  ) : (
                    'open'
                  ),
              },
              { head: 'What to look at', cell: ({ text }) => text },
              { head: 'Told', cell: toldWords },
            ]}
          />
        );
      }}
    </Loaded>
  );
}
