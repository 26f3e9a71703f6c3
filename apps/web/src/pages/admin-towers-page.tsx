import { PageHead } from '../components/layout/page-head';
import { AdminTabs } from '../features/admin/components/admin-tabs';
import { TowersView } from '../features/admin/components/towers-view';
import { useMe } from '../lib/api/use-me';

/** The towers and monitors. */
export function AdminTowersPage() {
  const { me } = useMe();
  return (
    <>
      <PageHead title={me?.role === 'administrator' ? 'Administration' : 'Towers'} />
      <AdminTabs />
      <TowersView />
    </>
  );
}
