import { Box, chakra, Stack } from '@chakra-ui/react';
import { useId, useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Message } from '../../../components/ui/message';
import { counted } from '../../../lib/format/number';
import { useAct } from '../../../lib/use-act';
import { enterTable } from '../api';
import type { ForecastTableResult } from '../types';

const MOST_CHARACTERS = 400_000;
const HEADER = 'district,day,low_c,cloud_percent,wind_m_per_s,high_c,mixing_height_m,note';

/** Brings a table of forecasts: chosen as a file, entered row by row, with what was refused and why. */
export function TableUpload({ onEntered }: { onEntered: () => void }) {
  const [result, setResult] = useState<ForecastTableResult>();
  const [fault, setFault] = useState<string>();
  const inputId = useId();
  const act = useAct(async (file: File) => {
    const text = await file.text();
    setResult(await enterTable(text));
    onEntered();
  });
  const take = (file: File | undefined) => {
    setResult(undefined);
    setFault(undefined);
    if (!file) return;
    if (file.size > MOST_CHARACTERS) return setFault('The table is too long: bring one winter at a time.');
    void act.run(file);
  };
  return (
    <Stack gap="3" align="flex-start">
      <Box>
        A comma-separated file, one row for each district and night; <em>day</em> is the day whose evening the
        night begins with:
        <Box fontFamily="mono" fontSize="sm" overflowWrap="anywhere" mt="1">
          {HEADER}
        </Box>
      </Box>
      <chakra.label htmlFor={inputId} fontWeight="600">
        Table of forecasts
      </chakra.label>
      <chakra.input
        id={inputId}
        type="file"
        accept=".csv,.txt"
        maxW="100%"
        disabled={act.busy}
        onChange={({ target }) => {
          take(target.files?.[0]);
          target.value = '';
        }}
      />
      {fault && <Message tone="wrong">{fault}</Message>}
      <Refusal problem={act.problem} />
      {result && (
        <Message
          tone={result.refused.length > 0 ? 'warn' : 'done'}
          title={`${counted(result.taken, 'forecast')} entered`}
        >
          {result.repeated > 0 && <p>{counted(result.repeated, 'row')} said what counts already.</p>}
          {result.refused.length > 0 && (
            <ul>
              {result.refused.slice(0, 20).map(({ row, text }) => (
                <li key={row}>{text}</li>
              ))}
            </ul>
          )}
          <Button kind="quiet" size="sm" onClick={() => setResult(undefined)}>
            I have read it
          </Button>
        </Message>
      )}
    </Stack>
  );
}
