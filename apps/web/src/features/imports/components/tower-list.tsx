import { paths } from '../../../app/paths';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { PlainTable } from '../../../components/ui/plain-table';
import { TextLink } from '../../../components/ui/text-link';
import { AgoText } from '../../../components/ui/time-text';
import { useFreshness } from '../api';

/** Every tower in use, how lately it was heard, and the way to its readings. */
export function TowerList({ zone }: { zone: string }) {
  return (
    <Loaded from={useFreshness()} what="the towers">
      {({ towers }) =>
        towers.length === 0 ? (
          <Empty title="There is no tower yet">Add one under Administration, with its sensors.</Empty>
        ) : (
          <PlainTable
            caption="Towers"
            rows={towers}
            keyOf={({ id }) => id}
            columns={[
              {
                head: 'Tower',
                cell: ({ id, name }) => <TextLink to={paths.towerReadings(id)}>{name}</TextLink>,
              },
              {
                head: 'Last heard',
                cell: ({ newest }) => (newest ? <AgoText at={newest} zone={zone} /> : 'never'),
              },
              {
                head: 'State',
                cell: ({ late, newest }) =>
                  !newest ? 'nothing yet' : late ? <strong>late</strong> : 'fresh',
              },
            ]}
          />
        )
      }
    </Loaded>
  );
}
