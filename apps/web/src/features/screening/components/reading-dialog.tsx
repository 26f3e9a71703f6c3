import { Box, chakra, Stack } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { paths } from '../../../app/paths';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { TextLink } from '../../../components/ui/text-link';
import { decimal } from '../../../lib/format/number';
import { dateAndTime } from '../../../lib/format/time';
import { useReading } from '../api';
import type { ReadingDetail, ReadingOrigin } from '../types';
import { SAID_NAME } from '../words';
import { QualityMark } from './quality-mark';

const Term = chakra('dt', { base: { color: 'mute', fontSize: 'sm' } });
const Said = chakra('dd', { base: { margin: 0, mb: '2.5' } });

interface ReadingDialogProps {
  towerId: number;
  reading: { sensorId: number; t: string };
  zone: string;
  onClose: () => void;
}

/** One reading, opened: its value, what was said of it, the file and row it came from, what it was before. */
export function ReadingDialog({ towerId, reading, zone, onClose }: ReadingDialogProps) {
  const detail = useReading(towerId, reading);
  return (
    <Dialog
      open
      onClose={onClose}
      title={`${detail.data?.sensorName ?? 'Reading'}, ${dateAndTime(reading.t, zone)}`}
      footer={<Button onClick={onClose}>Close</Button>}
    >
      <Loaded from={detail} what="the reading">
        {(data) => <Detail detail={data} zone={zone} />}
      </Loaded>
    </Dialog>
  );
}

const plain = (value: number): string => decimal(value, 2);

function Detail({ detail, zone }: { detail: ReadingDetail; zone: string }) {
  const { value, corrected, unit, t, quality, checks, word, from, earlier } = detail;
  return (
    <Box as="dl" m="0">
      <Fact name="As it came">
        <strong>
          {plain(value)} {unit}
        </strong>
        {corrected !== value && `, corrected ${plain(corrected)} ${unit}`} ({dateAndTime(t, 'UTC')})
      </Fact>
      <Fact name="State">
        <QualityMark quality={quality} />
      </Fact>
      <Fact name="What checks found">
        {checks.length === 0 ? 'nothing' : checks.map(({ check, says }) => <div key={check}>{says}</div>)}
      </Fact>
      {word && (
        <Fact name="What a person said">
          {SAID_NAME[word.quality]} by {word.by}, {dateAndTime(word.at, zone)}: {word.reason}
        </Fact>
      )}
      <Fact name="Came from">
        <Origin from={from} zone={zone} />
      </Fact>
      {earlier.length > 0 && (
        <Fact name="Before">
          <Stack gap="1">
            {earlier.map((each) => (
              <div key={each.until}>
                {plain(each.value)} {unit} until {dateAndTime(each.until, zone)},{' '}
                <Origin from={each.from} zone={zone} />
              </div>
            ))}
          </Stack>
        </Fact>
      )}
    </Box>
  );
}

function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <>
      <Term>{name}</Term>
      <Said>{children}</Said>
    </>
  );
}

function Origin({
  from: { importId, name, rowNo, receivedAt },
  zone,
}: {
  from: ReadingOrigin;
  zone: string;
}) {
  return (
    <>
      <TextLink to={paths.importResult(importId)}>{name}</TextLink>, row {rowNo}, received{' '}
      {dateAndTime(receivedAt, zone)}
    </>
  );
}
