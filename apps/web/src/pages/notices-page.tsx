import { PageHead } from '../components/layout/page-head';

/** The page; its feature is built next. */
export function NoticesPage() {
  return <PageHead title="Notices" />;
}
