import { Flex, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { paths } from '../../../app/paths';
import { Button, ButtonLink } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Message } from '../../../components/ui/message';
import { TextLink } from '../../../components/ui/text-link';
import { dateAndTime } from '../../../lib/format/time';
import { refusedTable } from '../api';
import type { Import } from '../types';
import { ORIGIN_WORDS, STATE_WORDS } from '../words';
import { ImportCounts } from './import-counts';
import { RefusedPart } from './refused-part';
import { WithdrawDialog } from './withdraw-dialog';

interface ImportViewProps {
  of: Import;
  zone: string;
  /** Whether the reader may import and undo. */
  canWrite: boolean;
  onChanged: () => void;
}

/** What an import gave, what was refused, and the way back. */
export function ImportView({ of, zone, canWrite, onChanged }: ImportViewProps) {
  const [undoing, setUndoing] = useState(false);
  const nothingNew = of.state === 'done' && of.new + of.corrected === 0 && of.repeated > 0;
  return (
    <Stack gap="4">
      <Card padded>
        <Stack gap="3">
          <p>
            {of.towerName} · {ORIGIN_WORDS[of.origin]} · {dateAndTime(of.receivedAt, zone)}
            {of.by ? ` · ${of.by}` : ''} · <strong>{STATE_WORDS[of.state]}</strong>
            {of.withdrawnAt
              ? ` by ${of.withdrawnBy ?? 'the service'}, ${dateAndTime(of.withdrawnAt, zone)}`
              : ''}
          </p>
          <ImportCounts from={of} />
          {nothingNew && <Message tone="info">Nothing was new: all of it was known already.</Message>}
          <Flex gap="3" wrap="wrap" align="center">
            {of.refused > 0 && (
              <ButtonLink to={refusedTable(of.id)} reloadDocument download>
                Download the refused rows
              </ButtonLink>
            )}
            {canWrite && of.canWithdraw && <Button onClick={() => setUndoing(true)}>Undo this import</Button>}
            <TextLink to={paths.towerReadings(of.towerId)}>Readings of {of.towerName}</TextLink>
            {canWrite && <TextLink to={paths.importFile(of.towerId)}>Import another file</TextLink>}
          </Flex>
        </Stack>
      </Card>
      {of.refused > 0 && <RefusedPart importId={of.id} />}
      {undoing && <WithdrawDialog of={of} onClose={() => setUndoing(false)} onDone={onChanged} />}
    </Stack>
  );
}
