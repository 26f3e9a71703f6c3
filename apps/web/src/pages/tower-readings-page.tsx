import { useParams } from 'react-router-dom';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { Empty } from '../components/states/empty';
import { Loaded } from '../components/states/loaded';
import { Loading } from '../components/states/loading';
import { TextLink } from '../components/ui/text-link';
import { useTowers } from '../features/screening/api';
import { TowerReadingsView } from '../features/screening/components/tower-readings-view';
import { useTowerZone } from '../lib/use-tower-zone';
import { useMe } from '../lib/api/use-me';

/** The readings of one tower: completeness, flags, what people set, corrections, and what that changed. */
export function TowerReadingsPage() {
  const id = Number(useParams().id);
  const towers = useTowers();
  const zone = useTowerZone(id);
  const { me } = useMe();
  const tower = towers.data?.find((each) => each.id === id);
  const settings =
    me && me.role !== 'officer' ? (
      <TextLink to={paths.adminTower(id)}>Tower and sensors</TextLink>
    ) : undefined;
  const wait = <Loading label="the readings" rows={3} rowHeight="240px" />;
  return (
    <>
      <PageHead title={tower ? `Readings of ${tower.name}` : 'Readings'} aside={tower && settings} />
      <Loaded from={towers} what="the tower" loading={wait}>
        {(all) => {
          if (!tower) return <Empty title="There is no such tower">Choose one under Readings.</Empty>;
          if (!me || zone === undefined) return wait;
          return <TowerReadingsView key={id} towers={all} tower={tower} zone={zone} me={me} />;
        }}
      </Loaded>
    </>
  );
}
