import { useParams } from 'react-router-dom';
import { PageHead } from '../components/layout/page-head';
import { Loaded } from '../components/states/loaded';
import { useImport } from '../features/imports/api';
import { ImportView } from '../features/imports/components/import-view';
import { useMe } from '../lib/api/use-me';
import { useTowerZone } from '../lib/use-tower-zone';

/** One import: what it gave, what was refused, and the way back. */
export function ImportPage() {
  const found = useImport(Number(useParams().id));
  const { me } = useMe();
  const zone = useTowerZone(found.data?.towerId ?? 0) ?? 'UTC';
  return (
    <>
      <PageHead title={found.data ? `Import of ${found.data.name}` : 'Import'} />
      <Loaded from={found} what="the import">
        {(of) => (
          <ImportView
            {...{ of, zone }}
            canWrite={me?.role !== 'officer'}
            onChanged={() => void found.mutate()}
          />
        )}
      </Loaded>
    </>
  );
}
