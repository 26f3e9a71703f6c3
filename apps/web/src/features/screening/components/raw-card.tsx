import { Flex, Stack } from '@chakra-ui/react';
import { useMemo, useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Loading } from '../../../components/states/loading';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { dateAndTime } from '../../../lib/format/time';
import { useRaw, useSetSpans } from '../api';
import { bandsOf } from '../bands';
import { daysEndingWith } from '../days';
import { NOTHING, selectionOf, snapped, type Selection } from '../selection';
import type { RawReadings, Said, Tower } from '../types';
import type { ReadingsChoice } from '../use-readings-choice';
import { rawSentence } from '../words';
import { RawChart } from './raw-chart';
import { RawTable } from './raw-table';
import { ReadingDialog } from './reading-dialog';
import { SelectionBar } from './selection-bar';
import { SensorChoice } from './sensor-choice';

interface RawCardProps {
  tower: Tower;
  zone: string;
  choice: ReadingsChoice;
  selection: Selection;
  onSelect: (selection: Selection) => void;
  /** Sets the chosen span; left out for those who only read. */
  onSay?: ((said: Said) => void) | undefined;
}

/** The readings as they came, with their flags; analysts choose spans in it. */
export function RawCard(props: RawCardProps) {
  const { tower, zone, choice } = props;
  const ends = daysEndingWith(choice.day, choice.days, zone);
  const raw = useRaw(tower.id, ends);
  return (
    <Card padded minW="0">
      <PartTitle mb="2">
        Readings as they came{' '}
        <Muted small fontWeight="400">
          {dateAndTime(ends.from, zone)} to {dateAndTime(ends.to, zone)}
        </Muted>
      </PartTitle>
      <Loaded
        from={raw}
        what="the readings"
        loading={<Loading label="the readings" rows={1} rowHeight="420px" />}
      >
        {(data) =>
          data.sensors.length === 0 ? (
            <Empty title="No sensor, no readings" />
          ) : (
            <RawPart {...props} raw={data} />
          )
        }
      </Loaded>
    </Card>
  );
}

function RawPart({
  raw,
  tower,
  zone,
  choice,
  selection,
  onSelect,
  onSay,
}: RawCardProps & { raw: RawReadings }) {
  const [hidden, setHidden] = useState<ReadonlySet<number>>(new Set());
  const [asTable, setAsTable] = useState(false);
  const [opened, setOpened] = useState<{ sensorId: number; t: string }>();
  const spans = useSetSpans(tower.id);
  const quantity = raw.sensors.some((sensor) => sensor.quantity === choice.quantity)
    ? choice.quantity
    : raw.sensors[0]!.quantity;
  const own = useMemo(() => raw.sensors.filter((sensor) => sensor.quantity === quantity), [raw, quantity]);
  const shown = useMemo(
    () => own.map((series, line) => ({ series, line })).filter(({ series }) => !hidden.has(series.sensorId)),
    [own, hidden],
  );
  const bands = useMemo(
    () => bandsOf(spans.data ?? [], own, selection, zone),
    [spans.data, own, selection, zone],
  );
  const words = rawSentence(shown.map(({ series }) => series));
  const hide = (sensorId: number, isHidden: boolean) =>
    setHidden((before) => {
      const after = new Set(before);
      if (isHidden) after.add(sensorId);
      else after.delete(sensorId);
      return after;
    });
  const draw = (a: number, b: number) => {
    const drawn = snapped(a, b, tower.intervalMinutes);
    const chosen = own.find(({ sensorId }) => sensorId === selection.sensorId) ?? shown[0]?.series ?? own[0]!;
    if (drawn) onSelect(selectionOf(chosen.sensorId, drawn, zone));
  };
  return (
    <Stack gap="3">
      <SensorChoice
        sensors={raw.sensors}
        quantity={quantity}
        hidden={hidden}
        onQuantity={(wanted) => {
          onSelect(NOTHING);
          choice.change({ quantity: wanted });
        }}
        onHide={hide}
      />
      {own.every(({ readings }) => readings === 0) ? (
        <Empty title="No readings in this time">Choose another day, or look into the tower’s sources.</Empty>
      ) : asTable ? (
        <RawTable shown={shown.map(({ series }) => series)} zone={zone} onOpen={setOpened} />
      ) : (
        <RawChart
          raw={raw}
          shown={shown}
          intervalMinutes={tower.intervalMinutes}
          bands={bands}
          label={`Readings of ${tower.name}, ${quantity}. ${words}`}
          onDraw={onSay && draw}
          onOpen={setOpened}
        />
      )}
      <Flex gap="3" align="flex-start" wrap="wrap">
        <Muted small flex="1" minW="240px">
          {words} A reading opens by a click. Triangle: suspect; cross: failed; dashed frame: set by a person
          {own.some(({ points }) => points.some(({ corrected }) => corrected !== undefined)) &&
            '; dashed line: corrected'}
          {own.some(({ thinned }) => thinned) &&
            '. Of so long a time the extremes of each part and what is flagged are shown'}
          .
        </Muted>
        <Button
          kind="quiet"
          size="sm"
          aria-pressed={asTable}
          onClick={() => setAsTable(!asTable)}
          data-screen-only
        >
          {asTable ? 'Chart' : 'Table'}
        </Button>
      </Flex>
      {onSay && (
        <SelectionBar sensors={own} selection={selection} zone={zone} onChange={onSelect} onSay={onSay} />
      )}
      {opened && (
        <ReadingDialog towerId={tower.id} reading={opened} zone={zone} onClose={() => setOpened(undefined)} />
      )}
    </Stack>
  );
}
