import { Box, chakra, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { EntryGrid } from '../../../components/form/entry-grid';
import { Field } from '../../../components/ui/field';
import { Input, Select } from '../../../components/ui/input';
import { marksOf } from '../mapping-draft';
import type { Mapping, Proposal, Tower } from '../types';
import { SEPARATORS, STAMPS, TIME_FORMS } from '../words';
import { TimeColumns } from './time-columns';

interface LayoutPartProps {
  proposal: Proposal;
  tower: Tower;
  draft: Mapping;
  onChange: (draft: Mapping) => void;
  /** Another sheet is looked at anew. */
  onSheet: (sheet: string) => void;
}

const Lines = chakra('pre', {
  base: {
    fontFamily: 'mono',
    fontSize: 'xs',
    overflowX: 'auto',
    bg: 'raised',
    borderRadius: 'l2',
    p: '3',
    m: '0',
    maxH: '220px',
  },
});

/** How the file is written: what was found, each of it to be corrected, above its first lines. */
export function LayoutPart({ proposal, tower, draft, onChange, onSheet }: LayoutPartProps) {
  const [marks, setMarks] = useState((draft.missing ?? []).join(' '));
  const set = (changes: Partial<Mapping>) => onChange({ ...draft, ...changes });
  const row = (text: string): number | undefined => (/^\d+$/.test(text) ? Number(text) : undefined);
  return (
    <Stack gap="4">
      <EntryGrid>
        {proposal.sheets && (
          <Field label="Sheet">
            <Select value={draft.sheet ?? ''} onChange={({ target }) => onSheet(target.value)}>
              {proposal.sheets.map((sheet) => (
                <option key={sheet}>{sheet}</option>
              ))}
            </Select>
          </Field>
        )}
        <Field label="Cells are cut by">
          <Select value={draft.separator ?? ','} onChange={({ target }) => set({ separator: target.value })}>
            {SEPARATORS.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </Select>
        </Field>
        <Field label="Decimal mark">
          <Select
            value={draft.decimal ?? '.'}
            onChange={({ target }) => set({ decimal: target.value as '.' | ',' })}
          >
            <option value=".">Point: −9.5</option>
            <option value=",">Comma: −9,5</option>
          </Select>
        </Field>
        <Field label="Header in row" help="0: there is none">
          <Input
            inputMode="numeric"
            value={draft.headerRow ?? 1}
            onChange={({ target }) => set({ headerRow: row(target.value) ?? 0 })}
          />
        </Field>
        <Field label="First reading in row">
          <Input
            inputMode="numeric"
            value={draft.firstDataRow ?? ''}
            onChange={({ target }) => {
              const firstDataRow = row(target.value);
              const { firstDataRow: _, ...rest } = draft;
              onChange(firstDataRow ? { ...rest, firstDataRow } : rest);
            }}
          />
        </Field>
        <Field label="A table that is">
          <Select
            value={draft.format ?? 'wide'}
            onChange={({ target }) => set({ format: target.value as 'wide' | 'long' })}
          >
            <option value="wide">wide: a column for each sensor</option>
            <option value="long">long: a row for each reading</option>
          </Select>
        </Field>
        {draft.format === 'long' &&
          (['sensorColumn', 'valueColumn'] as const).map((name) => (
            <Field
              key={name}
              label={name === 'sensorColumn' ? 'The sensor stands in' : 'The value stands in'}
            >
              <Select value={draft[name] ?? ''} onChange={({ target }) => set({ [name]: target.value })}>
                {proposal.columnNames.map((column) => (
                  <option key={column}>{column}</option>
                ))}
              </Select>
            </Field>
          ))}
        <Field label="The time is written">
          <Select
            value={draft.timeForm ?? 'iso'}
            onChange={({ target }) => set({ timeForm: target.value as NonNullable<Mapping['timeForm']> })}
          >
            {TIME_FORMS.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </Select>
        </Field>
        <Field
          label="The logger’s clock"
          help={`UTC, −07:00 or America/Denver. Empty: the tower’s, ${tower.clock}`}
        >
          <Input
            value={draft.clock ?? ''}
            onChange={({ target }) => {
              const { clock: _, ...rest } = draft;
              onChange(target.value === '' ? rest : { ...rest, clock: target.value.replace('−', '-') });
            }}
          />
        </Field>
        <Field label="A stamp means">
          <Select
            value={draft.stamp ?? tower.stamp}
            onChange={({ target }) => set({ stamp: target.value as NonNullable<Mapping['stamp']> })}
          >
            {STAMPS.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </Select>
        </Field>
        <Field
          label="Marks for no reading"
          help="One after the other, cut by blanks. An empty cell always is one."
        >
          <Input
            value={marks}
            onChange={({ target }) => {
              setMarks(target.value);
              set({ missing: marksOf(target.value) });
            }}
          />
        </Field>
      </EntryGrid>
      <TimeColumns names={proposal.columnNames} draft={draft} onChange={onChange} />
      <Box>
        <strong>The first lines of the file</strong>
        <Lines tabIndex={0} aria-label="The first lines of the file">
          {proposal.sampleLines.join('\n')}
        </Lines>
      </Box>
    </Stack>
  );
}
