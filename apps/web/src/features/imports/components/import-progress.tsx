import { Stack } from '@chakra-ui/react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { useAct } from '../../../lib/use-act';
import { cancelUpload } from '../api';
import type { Upload } from '../types';
import { ProgressLine } from './progress-line';

/** An import under way: how far it is, and the way to stop it. It goes on when the page is left. */
export function ImportProgress({ upload, onAnswer }: { upload: Upload; onAnswer: () => void }) {
  const cancel = useAct(() => cancelUpload(upload.id).finally(onAnswer));
  return (
    <Card padded>
      <Stack gap="3" align="flex-start">
        <ProgressLine
          label={`Importing ${upload.name}`}
          share={upload.bytesDone / Math.max(upload.bytes, 1)}
        />
        <p>It goes on when you leave this page. Findings follow while it runs.</p>
        <Button busy={cancel.busy} onClick={() => void cancel.run(undefined)}>
          Cancel the import
        </Button>
        <Refusal problem={cancel.problem} />
      </Stack>
    </Card>
  );
}
