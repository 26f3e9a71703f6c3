import { PageHead } from '../components/layout/page-head';
import { AdminTabs } from '../features/admin/components/admin-tabs';
import { TowersView } from '../features/admin/components/towers-view';

/** The towers and monitors. */
export function AdminTowersPage() {
  return (
    <>
      <PageHead title="Administration" />
      <AdminTabs />
      <TowersView />
    </>
  );
}
