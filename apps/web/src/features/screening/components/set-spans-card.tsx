import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Dialog } from '../../../components/ui/dialog';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { PlainTable } from '../../../components/ui/plain-table';
import { InstantText } from '../../../components/ui/time-text';
import { useAct } from '../../../lib/use-act';
import { undoSpan, useSetSpans } from '../api';
import type { SetSpan } from '../types';
import { SAID_NAME } from '../words';
import { QualityMark } from './quality-mark';
import { SpanText } from './span-text';

interface SetSpansCardProps {
  towerId: number;
  zone: string;
  mayUndo: boolean;
  /** Shows a span in the chart. */
  onShow: (span: SetSpan) => void;
  onUndone: () => void;
}

/** What people have said of this tower's readings, who and why; what was undone stays on the record. */
export function SetSpansCard({ towerId, zone, mayUndo, onShow, onUndone }: SetSpansCardProps) {
  const spans = useSetSpans(towerId);
  const [asked, setAsked] = useState<SetSpan>();
  return (
    <Card padded minW="0">
      <PartTitle mb="2">Set by people</PartTitle>
      <Loaded from={spans} what="what people have set">
        {(rows) =>
          rows.length === 0 ? (
            <Empty title="Nothing is set by hand">What the checks say holds for every reading.</Empty>
          ) : (
            <PlainTable
              caption="Spans set by people"
              rows={rows}
              keyOf={({ id }) => id}
              columns={[
                { head: 'Sensor', cell: ({ sensorName }) => <strong>{sensorName}</strong> },
                { head: 'When', cell: (span) => <SpanText span={span} zone={zone} /> },
                {
                  head: 'Said',
                  cell: ({ quality }) => (
                    <QualityMark quality={quality}>{SAID_NAME[quality].toLowerCase()}</QualityMark>
                  ),
                },
                { head: 'Why, and who', cell: (span) => <Why span={span} zone={zone} /> },
                {
                  head: 'Show',
                  cell: (span) => (
                    <Button
                      size="sm"
                      aria-label={`Show ${span.sensorName}, ${span.reason}`}
                      onClick={() => onShow(span)}
                    >
                      Show
                    </Button>
                  ),
                },
                {
                  head: 'Now',
                  cell: (span) => (
                    <Now span={span} zone={zone} onUndo={mayUndo ? () => setAsked(span) : undefined} />
                  ),
                },
              ]}
            />
          )
        }
      </Loaded>
      {asked && <UndoDialog span={asked} onClose={() => setAsked(undefined)} onUndone={onUndone} />}
    </Card>
  );
}

function Why({ span: { reason, by, at }, zone }: { span: SetSpan; zone: string }) {
  return (
    <>
      {reason}{' '}
      <Muted small display="block">
        {by}, <InstantText at={at} zone={zone} />
      </Muted>
    </>
  );
}

function Now({ span, zone, onUndo }: { span: SetSpan; zone: string; onUndo: (() => void) | undefined }) {
  if (span.undoneAt !== null)
    return (
      <>
        undone{' '}
        <Muted small display="block">
          {span.undoneBy}, <InstantText at={span.undoneAt} zone={zone} />
        </Muted>
      </>
    );
  if (!onUndo) return 'holds';
  return (
    <Button size="sm" aria-label={`Undo, ${span.sensorName}: ${span.reason}`} onClick={onUndo}>
      Undo
    </Button>
  );
}

function UndoDialog({
  span,
  onClose,
  onUndone,
}: {
  span: SetSpan;
  onClose: () => void;
  onUndone: () => void;
}) {
  const act = useAct(async (id: number) => {
    const undone = await undoSpan(id).finally(onUndone);
    onClose();
    return undone;
  });
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Undo what was said of ${span.sensorName}?`}
      footer={
        <>
          <Button kind="go" busy={act.busy} onClick={() => void act.run(span.id)}>
            Undo it
          </Button>
          <Button onClick={onClose}>Back</Button>
        </>
      }
    >
      <Stack gap="3">
        <p>
          The checks decide again for these readings, and all that depends on them is worked out anew. That it
          was set, and why, stays on the record.
        </p>
        <Refusal problem={act.problem} />
      </Stack>
    </Dialog>
  );
}
