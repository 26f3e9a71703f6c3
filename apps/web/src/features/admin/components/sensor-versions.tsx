import { Box } from '@chakra-ui/react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { PlainTable } from '../../../components/ui/plain-table';
import { dateAndTime } from '../../../lib/format/time';
import { useAct } from '../../../lib/use-act';
import { removeVersion } from '../api';
import type { Sensor } from '../types';

const short = (value: number): string => String(Number(value.toPrecision(3))).replace('-', '−');

/** What was true of a sensor from when on, the newest first; one entered by mistake can be taken back. */
export function SensorVersions({
  sensor,
  zone,
  onChanged,
}: {
  sensor: Sensor;
  zone: string;
  onChanged: () => void;
}) {
  const act = useAct(async (from: string | null) => {
    await removeVersion(sensor.id, from);
    onChanged();
  });
  const words = (from: string | null): string => (from === null ? 'the beginning' : dateAndTime(from, zone));
  return (
    <Box>
      <PlainTable
        caption={`What held of ${sensor.name}`}
        rows={sensor.versions.toReversed()}
        keyOf={({ from }) => from ?? 'beginning'}
        columns={[
          { head: 'From', cell: ({ from }) => words(from) },
          {
            head: 'What held',
            cell: ({ heightM, gain, offset, sigma, pairSigma, note }) =>
              `${short(heightM)} m, ${short(gain)} × reading + ${short(offset)}, σ ${short(sigma)}` +
              (pairSigma === null ? '' : `, pair ${short(pairSigma)}`) +
              (note ? ` (${note})` : ''),
          },
          {
            head: 'Undo',
            cell: ({ from }) =>
              sensor.versions.length > 1 && (
                <Button
                  kind="quiet"
                  size="sm"
                  busy={act.busy}
                  aria-label={`Take back what holds from ${words(from)}`}
                  onClick={() => void act.run(from)}
                >
                  Take back
                </Button>
              ),
          },
        ]}
      />
      <Refusal problem={act.problem} />
    </Box>
  );
}
