import { PageHead } from '../components/layout/page-head';
import { AdminTabs } from '../features/admin/components/admin-tabs';
import { DistrictsView } from '../features/admin/components/districts-view';

/** The districts, and the office that signs. */
export function AdminDistrictsPage() {
  return (
    <>
      <PageHead title="Administration" />
      <AdminTabs />
      <DistrictsView />
    </>
  );
}
