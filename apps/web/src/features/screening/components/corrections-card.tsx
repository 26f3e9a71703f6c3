import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { dateAndTime } from '../../../lib/format/time';
import type { Sensor, SensorVersion } from '../types';
import { CorrectionDialog } from './correction-dialog';

interface CorrectionsCardProps {
  sensors: readonly Sensor[];
  zone: string;
  mayCorrect: boolean;
  onCorrected: () => void;
}

/** The dated corrections of a tower's sensors, and a way to add one. */
export function CorrectionsCard({ sensors, zone, mayCorrect, onCorrected }: CorrectionsCardProps) {
  const [asked, setAsked] = useState<Sensor>();
  return (
    <Card padded minW="0">
      <PartTitle mb="2">
        Corrections{' '}
        <Muted small fontWeight="400">
          corrected = gain × reading + offset, from an instant on
        </Muted>
      </PartTitle>
      {sensors.length === 0 ? (
        <Empty title="No sensor yet" />
      ) : (
        <PlainTable
          caption="Corrections by sensor"
          rows={sensors.filter(({ retired }) => !retired)}
          keyOf={({ id }) => id}
          columns={[
            { head: 'Sensor', cell: ({ name }) => <strong>{name}</strong> },
            { head: 'Corrections', cell: (sensor) => <Versions sensor={sensor} zone={zone} /> },
            ...(mayCorrect
              ? [
                  {
                    head: 'Change',
                    cell: (sensor: Sensor) => (
                      <Button
                        size="sm"
                        aria-label={`Correct ${sensor.name}`}
                        onClick={() => setAsked(sensor)}
                      >
                        Correct…
                      </Button>
                    ),
                  },
                ]
              : []),
          ]}
        />
      )}
      {asked && (
        <CorrectionDialog
          sensor={asked}
          zone={zone}
          onClose={() => setAsked(undefined)}
          onCorrected={onCorrected}
        />
      )}
    </Card>
  );
}

const said = ({ gain, offset }: SensorVersion, unit: string): string => {
  if (gain === 1 && offset === 0) return 'as read';
  const sign = offset < 0 ? '−' : '+';
  const added = offset === 0 ? '' : ` ${sign} ${Math.abs(offset)} ${unit}`;
  return `${gain === 1 ? 'reading' : `${gain} × reading`}${added}`;
};

const isSame = (a: SensorVersion, b: SensorVersion | undefined): boolean =>
  a.gain === b?.gain && a.offset === b.offset;

function Versions({ sensor: { versions, unit }, zone }: { sensor: Sensor; zone: string }) {
  const changes = versions.filter((version, i) => !isSame(version, versions[i - 1]));
  return (
    <>
      {changes.map((version) => (
        <span key={version.from ?? ''} style={{ display: 'block' }}>
          {said(version, unit)}{' '}
          <Muted small>
            {version.from === null ? 'from the beginning' : `from ${dateAndTime(version.from, zone)}`}
            {version.note && `: ${version.note}`}
          </Muted>
        </span>
      ))}
    </>
  );
}
