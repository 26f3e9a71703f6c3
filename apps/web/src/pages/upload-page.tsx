import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { Failed } from '../components/states/failed';
import { Loaded } from '../components/states/loaded';
import { Loading } from '../components/states/loading';
import { TextLink } from '../components/ui/text-link';
import { useImport, useProposal, useTowers, useUpload } from '../features/imports/api';
import { CheckFile } from '../features/imports/components/check-file';
import { ImportProgress } from '../features/imports/components/import-progress';
import { ImportView } from '../features/imports/components/import-view';
import type { Upload } from '../features/imports/types';
import { useTowerZone } from '../lib/use-tower-zone';

/** A sent file: looked at and corrected, then imported, then what came of it. */
export function UploadPage() {
  const id = Number(useParams().id);
  const upload = useUpload(id);
  return (
    <>
      <PageHead title={upload.data ? `Import ${upload.data.name}` : 'Import a file'} />
      <Loaded from={upload} what="the file">
        {(found) => <Steps key={id} upload={found} onChanged={() => void upload.mutate()} />}
      </Loaded>
    </>
  );
}

function Steps({ upload, onChanged }: { upload: Upload; onChanged: () => void }) {
  const zone = useTowerZone(upload.towerId);
  const result = useImport(upload.importId);
  if (zone === undefined) return <Loading label="the file" />;
  if (upload.state === 'running') return <ImportProgress upload={upload} onAnswer={onChanged} />;
  if (upload.state === 'done' || (upload.state === 'cancelled' && upload.importId !== null)) {
    return (
      <Loaded from={result} what="what came of it">
        {(found) => <ImportView of={found} zone={zone} canWrite onChanged={() => void result.mutate()} />}
      </Loaded>
    );
  }
  return <Check upload={upload} zone={zone} onBegun={onChanged} />;
}

function Check({ upload, zone, onBegun }: { upload: Upload; zone: string; onBegun: () => void }) {
  const [sheet, setSheet] = useState<string>();
  const proposal = useProposal(upload.id, sheet);
  const towers = useTowers();
  if (proposal.error) {
    return (
      <>
        <Failed what="what is in the file" problem={proposal.error} />
        <TextLink to={paths.importFile(upload.towerId)}>Choose another file</TextLink>
      </>
    );
  }
  const tower = towers.data?.find(({ id }) => id === upload.towerId);
  if (!proposal.data || !tower) return <Loading label="what is in the file" rows={4} />;
  const key = `${upload.id} ${proposal.data.mapping.sheet ?? ''}`;
  return (
    <CheckFile key={key} {...{ upload, tower, zone, onBegun }} proposal={proposal.data} onSheet={setSheet} />
  );
}
