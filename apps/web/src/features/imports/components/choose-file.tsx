import { Box, chakra, Flex, Stack } from '@chakra-ui/react';
import { useId, useRef, useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/input';
import { Message } from '../../../components/ui/message';
import { count } from '../../../lib/format/number';
import { useAct } from '../../../lib/use-act';
import { LARGEST_FILE, sendFile } from '../send-file';
import type { Tower, Upload } from '../types';
import { ProgressLine } from './progress-line';

const Drop = chakra('div', {
  base: {
    borderWidth: '2px',
    borderStyle: 'dashed',
    borderColor: 'edge',
    borderRadius: 'l3',
    px: '5',
    py: '8',
    textAlign: 'center',
    _focusWithin: { outline: '2px solid', outlineColor: 'air', outlineOffset: '2px' },
  },
  variants: { over: { true: { borderColor: 'air', bg: 'air-soft' } } },
});

interface ChooseFileProps {
  towers: Tower[];
  /** The tower to begin with. */
  towerId?: number;
  onSent: (upload: Upload) => void;
}

/** The tower, and the file that holds its readings: chosen or dropped, and sent with its progress. */
export function ChooseFile({ towers, towerId, onSent }: ChooseFileProps) {
  const inUse = towers.filter((tower) => !tower.retired);
  const [chosen, setChosen] = useState<number | undefined>(
    inUse.find(({ id }) => id === towerId)?.id ?? (inUse.length === 1 ? inUse[0]?.id : undefined),
  );
  const [share, setShare] = useState(0);
  const [over, setOver] = useState(false);
  const [fault, setFault] = useState<string>();
  const input = useRef<HTMLInputElement>(null);
  const inputId = useId();
  const act = useAct(async (file: File) => {
    if (chosen === undefined) return;
    setShare(0);
    onSent(await sendFile(chosen, file, setShare));
  });
  const take = (file: File | undefined) => {
    if (!file) return;
    setFault(undefined);
    if (chosen === undefined) return setFault('Choose the tower first.');
    if (file.size === 0) return setFault(`"${file.name}" is empty. Choose the file that holds the readings.`);
    if (file.size > LARGEST_FILE) {
      return setFault(
        `"${file.name}" has ${count(Math.round(file.size / 1e6))} MB. Split it by time: 200 MB at most.`,
      );
    }
    void act.run(file);
  };
  return (
    <Card padded>
      <Stack gap="4">
        <Box maxW="420px">
          <Field label="Tower" required>
            <Select
              value={chosen ?? ''}
              onChange={({ target }) => setChosen(target.value === '' ? undefined : Number(target.value))}
            >
              <option value="">Choose the tower</option>
              {inUse.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </Select>
          </Field>
        </Box>
        <Drop
          over={over}
          onDragOver={(event) => {
            event.preventDefault();
            setOver(true);
          }}
          onDragLeave={() => setOver(false)}
          onDrop={(event) => {
            event.preventDefault();
            setOver(false);
            take(event.dataTransfer.files[0]);
          }}
        >
          {act.busy ? (
            <ProgressLine label="Sending the file" share={share} />
          ) : (
            <Flex direction="column" gap="2" align="center">
              <chakra.label htmlFor={inputId} fontWeight="600">
                Drop the logger’s file here, or choose it
              </chakra.label>
              <chakra.input
                ref={input}
                id={inputId}
                type="file"
                accept=".csv,.tsv,.txt,.dat,.data,.xlsx"
                srOnly
                onChange={({ target }) => {
                  take(target.files?.[0]);
                  target.value = '';
                }}
              />
              <Button kind="go" onClick={() => input.current?.click()} tabIndex={-1} aria-hidden="true">
                Choose a file
              </Button>
              <Box color="mute" fontSize="sm" maxW="56ch">
                Text cut by commas, semicolons, tabs or blanks, up to 200 MB, or a spreadsheet (.xlsx), up to
                20 MB. How it is laid out is found out; nothing is taken before you have seen it.
              </Box>
            </Flex>
          )}
        </Drop>
        {fault && <Message tone="wrong">{fault}</Message>}
        <Refusal problem={act.problem} />
      </Stack>
    </Card>
  );
}
