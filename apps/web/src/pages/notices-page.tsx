import { PageHead } from '../components/layout/page-head';
import { NoticeLog } from '../features/notices/components/notice-log';

/** The notice log. */
export function NoticesPage() {
  return (
    <>
      <PageHead title="Notices" />
      <NoticeLog />
    </>
  );
}
