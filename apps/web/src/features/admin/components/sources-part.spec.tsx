import { ChakraProvider } from '@chakra-ui/react';
import { fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { SWRConfig } from 'swr';
import { ClockContext } from '../../../lib/clock';
import { system } from '../../../theme/system';
import type { Source } from '../types';
import { SourcesPart } from './sources-part';

const now = Date.parse('2026-01-16T01:00:00Z');
const source = {
  ...{ id: 7, towerId: 1, kind: 'http', path: null, url: 'https://loggers.pellworth.example/mast.csv' },
  ...{ auth: 'basic', hasSecret: true, mapping: { format: 'wide' }, intervalSeconds: 300, collecting: false },
  ...{ lastAt: '2026-01-16T00:57:00Z', lastOkAt: '2026-01-16T00:57:00Z', lastResult: '12 new readings.' },
  ...{ failures: 0, failingSince: null, nextAt: '2026-01-16T01:02:00Z', version: 3 },
} as unknown as Source;

const upload = {
  ...{ id: 2, name: 'january.csv', kind: 'text', state: 'done' },
  mapping: { format: 'long', separator: ';', sensorColumn: 'which' },
};

interface Asked {
  method: string;
  path: string;
  body: unknown;
}

/** Shows the part to somebody; the service answers with these sources, and refuses what `refusal` says. */
function show(role: string, sources: Source[], refusal?: object) {
  const asked: Asked[] = [];
  globalThis.fetch = jest.fn((path: string, { method, body }: RequestInit) => {
    asked.push({ method: method!, path, body: body ? JSON.parse(String(body)) : undefined });
    const answers: Record<string, unknown> = {
      '/api/auth/me': { id: 1, role, name: 'Ada', email: 'ada@pellworth.example', districts: [] },
      '/api/towers/1/sources': sources,
      '/api/districts': [],
      '/api/uploads?towerId=1': [upload],
    };
    const refused = refusal !== undefined && method === 'PATCH';
    const answer = refused ? refusal : method === 'GET' ? answers[path] : source;
    const headers = { 'content-type': 'application/json' };
    return Promise.resolve(new Response(JSON.stringify(answer), { status: refused ? 422 : 200, headers }));
  }) as unknown as typeof fetch;
  render(
    <ChakraProvider value={system}>
      <ClockContext value={() => now}>
        <SWRConfig value={{ provider: () => new Map() }}>
          <SourcesPart towerId={1} />
        </SWRConfig>
      </ClockContext>
    </ChakraProvider>,
  );
  return { sent: () => asked.filter(({ method }) => method !== 'GET') };
}

it('says how a source stands, and collects it at once', async () => {
  const { sent } = show('analyst', [source]);
  expect(await screen.findByText('Collected 3 min ago: 12 new readings. Next at 01:02 UTC.')).toBeVisible();
  fireEvent.click(screen.getByRole('button', { name: /^Collect now/ }));
  await waitFor(() => expect(sent()).toEqual([{ method: 'POST', path: '/api/sources/7/collect', body: {} }]));
});

it('leaves sources over HTTP to the administrator', async () => {
  show('analyst', [source]);
  await screen.findByText(source.url!);
  expect(screen.queryByRole('button', { name: /^(Change|Retire)/ })).toBeNull();
  fireEvent.click(screen.getByRole('button', { name: 'Add a source' }));
  const kinds = within(screen.getByLabelText('How do the readings come?')).getAllByRole('option');
  expect(kinds.map((each) => each.getAttribute('value'))).toEqual(['folder', 'push']);
  expect(await screen.findByRole('button', { name: 'Take the layout of january.csv' })).toBeVisible();
});

it('keeps credentials that are not typed anew, and shows what is refused beside its field', async () => {
  const errors = [{ field: 'password', text: 'The address leads to another place.' }];
  const { sent } = show('administrator', [source], { code: 'invalid', detail: 'No.', errors });
  fireEvent.click(await screen.findByRole('button', { name: /^Change/ }));
  const url = 'https://other.pellworth.example/mast.csv';
  fireEvent.change(screen.getByLabelText(/Address of the file/), { target: { value: url } });
  fireEvent.click(screen.getByRole('button', { name: 'Keep the change' }));
  expect(await screen.findByText('The address leads to another place.')).toBeVisible();
  expect(screen.getByLabelText(/Address of the file/)).toHaveValue(url);
  expect(sent()[0]).toMatchObject({ path: '/api/sources/7', body: { url, auth: 'basic', version: 3 } });
  expect(sent()[0]!.body).not.toHaveProperty('password');
});

it('invites to add the first source, laid out as the last uploaded file', async () => {
  const { sent } = show('administrator', []);
  expect(await screen.findByText('No source yet')).toBeVisible();
  fireEvent.click(screen.getByRole('button', { name: 'Add a source' }));
  fireEvent.change(screen.getByLabelText(/File or folder/), { target: { value: 'mast' } });
  fireEvent.click(await screen.findByRole('button', { name: 'Take the layout of january.csv' }));
  expect(screen.getByLabelText(/Column with the sensor/)).toHaveValue('which');
  fireEvent.click(screen.getByRole('button', { name: 'Add the source' }));
  await waitFor(() => expect(sent()).toHaveLength(1));
  expect(sent()[0]).toMatchObject({ body: { kind: 'folder', path: 'mast', mapping: upload.mapping } });
});
