import { useNavigate, useSearchParams } from 'react-router-dom';
import { paths } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { Empty } from '../components/states/empty';
import { Loaded } from '../components/states/loaded';
import { useTowers } from '../features/imports/api';
import { ChooseFile } from '../features/imports/components/choose-file';

/** The first step of an import: for which tower, and which file. */
export function ImportFilePage() {
  const towers = useTowers();
  const navigate = useNavigate();
  const [query] = useSearchParams();
  return (
    <>
      <PageHead title="Import a file" />
      <Loaded from={towers} what="the towers">
        {(all) =>
          all.length === 0 ? (
            <Empty title="There is no tower yet">Add one under Administration, with its sensors.</Empty>
          ) : (
            <ChooseFile
              towers={all}
              towerId={Number(query.get('tower') ?? NaN)}
              onSent={({ id }) => void navigate(paths.upload(id))}
            />
          )
        }
      </Loaded>
    </>
  );
}
