import { Stack } from '@chakra-ui/react';
import { useRef, useState } from 'react';
import type { Me } from '../../../lib/api/types';
import { useNow } from '../../../lib/clock';
import { useRefresh } from '../api';
import { dayIn, daysFromTo } from '../days';
import { NOTHING, selectedEnds, selectionOf, type Selection } from '../selection';
import type { FlaggedSpan, Said, Tower } from '../types';
import { SPANS, useReadingsChoice } from '../use-readings-choice';
import { CalendarCard } from './calendar-card';
import { CorrectionsCard } from './corrections-card';
import { FlagsCard } from './flags-card';
import { LimitsCard } from './limits-card';
import { RawCard } from './raw-card';
import { ReadingsBar } from './readings-bar';
import { ReworksCard } from './reworks-card';
import { SetSpanDialog } from './set-span-dialog';
import { SetSpansCard } from './set-spans-card';

interface TowerReadingsViewProps {
  towers: readonly Tower[];
  tower: Tower;
  zone: string;
  me: Pick<Me, 'role'>;
}

/** A tower's readings: how complete they are, what checks found, what people say of them, and what that changed. */
export function TowerReadingsView({ towers, tower, zone, me }: TowerReadingsViewProps) {
  const choice = useReadingsChoice(zone, useNow());
  const [selection, setSelection] = useState<Selection>(NOTHING);
  const chart = useRef<HTMLDivElement>(null);
  const [said, setSaid] = useState<Said>();
  const refresh = useRefresh(tower.id);
  const ends = selectedEnds(selection, zone);
  const sensor = tower.sensors.find(({ id }) => id === selection.sensorId);
  const show = (span: Pick<FlaggedSpan, 'sensorId' | 'from' | 'to'>) => {
    const own = tower.sensors.find(({ id }) => id === span.sensorId);
    const [first, last] = [dayIn(span.from, zone), dayIn(Date.parse(span.to) - 1, zone)];
    const needed = daysFromTo(first < last ? first : last, last);
    setSelection(selectionOf(span.sensorId, span, zone));
    choice.change({
      day: last,
      days: SPANS.find((each) => each.days >= needed)?.days ?? 31,
      ...(own && { quantity: own.quantity }),
    });
    chart.current?.scrollIntoView({ block: 'start' });
    chart.current?.focus({ preventScroll: true });
  };
  return (
    <Stack gap="4">
      <ReadingsBar towers={towers} towerId={tower.id} choice={choice} />
      <CalendarCard towerId={tower.id} choice={choice} />
      <div ref={chart} tabIndex={-1}>
        <RawCard
          {...{ tower, zone, choice, selection }}
          onSelect={setSelection}
          onSay={me.role === 'analyst' ? setSaid : undefined}
        />
      </div>
      <ReworksCard towerId={tower.id} zone={zone} onEnded={refresh} />
      <FlagsCard towerId={tower.id} sensors={tower.sensors} zone={zone} choice={choice} onShow={show} />
      <SetSpansCard
        towerId={tower.id}
        zone={zone}
        mayUndo={me.role === 'analyst'}
        onShow={show}
        onUndone={refresh}
      />
      <CorrectionsCard
        sensors={tower.sensors}
        zone={zone}
        mayCorrect={me.role !== 'officer'}
        onCorrected={refresh}
      />
      <LimitsCard towerId={tower.id} mayChange={me.role !== 'officer'} onChanged={refresh} />
      {said && ends && sensor && (
        <SetSpanDialog
          span={{ ...ends, said, sensorId: sensor.id, sensorName: sensor.name }}
          zone={zone}
          onClose={() => setSaid(undefined)}
          onSet={() => {
            setSelection(NOTHING);
            refresh();
          }}
        />
      )}
    </Stack>
  );
}
