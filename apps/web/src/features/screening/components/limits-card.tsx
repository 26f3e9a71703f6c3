import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { useLimits } from '../api';
import { changedPhrases, limitPhrases } from '../limit-words';
import type { SensorLimits } from '../types';
import { LimitsDialog } from './limits-dialog';

interface LimitsCardProps {
  towerId: number;
  mayChange: boolean;
  onChanged: () => void;
}

/** The limits of the checks of each sensor, and a way to set others. */
export function LimitsCard({ towerId, mayChange, onChanged }: LimitsCardProps) {
  const limits = useLimits(towerId);
  const [asked, setAsked] = useState<SensorLimits>();
  const change = {
    head: 'Change',
    cell: (row: SensorLimits) => (
      <Button size="sm" aria-label={`Change the limits of ${row.sensorName}`} onClick={() => setAsked(row)}>
        Change…
      </Button>
    ),
  };
  return (
    <Card padded minW="0">
      <PartTitle mb="2">
        Limits of the checks{' '}
        <Muted small fontWeight="400">
          published ones, as long as nobody sets others
        </Muted>
      </PartTitle>
      <Loaded from={limits} what="the limits">
        {(rows) =>
          rows.length === 0 ? (
            <Empty title="No sensor yet" />
          ) : (
            <PlainTable
              caption="Limits by sensor"
              rows={rows}
              keyOf={({ sensorId }) => sensorId}
              columns={[
                { head: 'Sensor', cell: ({ sensorName }) => <strong>{sensorName}</strong> },
                { head: 'Limits', cell: (row) => limitPhrases(row.limits, row.usual, row.unit).join(', ') },
                {
                  head: 'Other than usual',
                  cell: (row) => changedPhrases(row.limits, row.usual, row.unit).join(', ') || 'nothing',
                },
                ...(mayChange ? [change] : []),
              ]}
            />
          )
        }
      </Loaded>
      {asked && (
        <LimitsDialog
          row={asked}
          onClose={() => setAsked(undefined)}
          onChanged={() => {
            void limits.mutate();
            onChanged();
          }}
        />
      )}
    </Card>
  );
}
