import { PageHead } from '../components/layout/page-head';
import { AdminTabs } from '../features/admin/components/admin-tabs';
import { UsersView } from '../features/admin/components/users-view';

/** Who signs in, and the invitation of more. */
export function AdminPeoplePage() {
  return (
    <>
      <PageHead title="Administration" />
      <AdminTabs />
      <UsersView />
    </>
  );
}
