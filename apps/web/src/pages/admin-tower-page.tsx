import { useParams } from 'react-router-dom';
import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { AdminTabs } from '../features/admin/components/admin-tabs';
import { TowerView } from '../features/admin/components/tower-view';
import { useTower } from '../features/admin/api';

/** One tower: its sensors, sources, keys and settings. */
export function AdminTowerPage() {
  const tower = useTower(Number(useParams().id));
  return (
    <>
      <PageHead title={tower.data?.name ?? 'Tower'} />
      <AdminTabs />
      <Loaded from={tower} what="the tower">
        {(found) => <TowerView tower={found} mayMakeKeys onChanged={() => void tower.mutate()} />}
      </Loaded>
    </>
  );
}
