import { useParams } from 'react-router-dom';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { TextLink } from '../components/ui/text-link';
import { AdminTabs } from '../features/admin/components/admin-tabs';
import { TowerView } from '../features/admin/components/tower-view';
import { useTower } from '../features/admin/api';
import { useMe } from '../lib/api/use-me';
import { useTowerZone } from '../lib/use-tower-zone';

/** One tower: its sensors, sources, keys and settings. */
export function AdminTowerPage() {
  const id = Number(useParams().id);
  const tower = useTower(id);
  const zone = useTowerZone(id) ?? 'UTC';
  const { me } = useMe();
  return (
    <>
      <PageHead
        title={tower.data?.name ?? 'Tower'}
        aside={<TextLink to={paths.towerReadings(id)}>Its readings</TextLink>}
      />
      <AdminTabs />
      <Loaded from={tower} what="the tower">
        {(found) => (
          <TowerView
            tower={found}
            zone={zone}
            mayMakeKeys={me?.role === 'administrator'}
            onChanged={() => void tower.mutate()}
          />
        )}
      </Loaded>
    </>
  );
}
