import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { useDistrictSettings } from '../features/admin/api';
import { RulesView } from '../features/admin/components/rules-view';
import { useMe } from '../lib/api/use-me';

/** Each district's rule: the version in force in plain words, and drafts. */
export function RulesPage() {
  const districts = useDistrictSettings();
  const { me } = useMe();
  return (
    <>
      <PageHead title="Rules" />
      <Loaded from={districts} what="the districts">
        {(all) => <RulesView districts={all} mayDraft={me?.role === 'analyst'} />}
      </Loaded>
    </>
  );
}
