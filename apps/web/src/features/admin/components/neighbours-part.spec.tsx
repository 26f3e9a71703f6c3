import { ChakraProvider } from '@chakra-ui/react';
import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { SWRConfig } from 'swr';
import { system } from '../../../theme/system';
import type { Tower } from '../types';
import { NeighboursPart } from './neighbours-part';

const tower = (id: number, name: string, retired = false) =>
  ({ id, name, retired, elevationM: 1100 + 10 * id, sensors: [] }) as unknown as Tower;
const towers = [
  tower(1, 'Mill mast'),
  tower(2, 'Bench mast'),
  tower(3, 'Old mast', true),
  tower(4, 'Tarn mast'),
];

/** Shows the part of the first tower, which has these neighbours; the service refuses what it is sent, if told to. */
function show(towerIds: number[], refusal?: object) {
  const sent: unknown[] = [];
  let set = towerIds;
  globalThis.fetch = jest.fn((path: string, { method, body }: RequestInit) => {
    if (method === 'PUT') {
      const given = JSON.parse(String(body)) as { towerIds: number[] };
      sent.push({ path, ...given });
      if (!refusal) set = given.towerIds;
    }
    const refused = refusal !== undefined && method === 'PUT';
    const answer = refused ? refusal : path === '/api/towers' ? towers : { towerIds: set };
    const headers = { 'content-type': 'application/json' };
    return Promise.resolve(new Response(JSON.stringify(answer), { status: refused ? 422 : 200, headers }));
  }) as unknown as typeof fetch;
  render(
    <ChakraProvider value={system}>
      <SWRConfig value={{ provider: () => new Map() }}>
        <NeighboursPart tower={towers[0]!} />
      </SWRConfig>
    </ChakraProvider>,
  );
  return sent;
}

it('offers the other towers in use, and sets those that are chosen', async () => {
  const sent = show([2]);
  expect(await screen.findByRole('checkbox', { name: 'Bench mast (1120 m)' })).toBeChecked();
  expect(screen.getAllByRole('checkbox')).toHaveLength(2);
  fireEvent.click(screen.getByRole('checkbox', { name: 'Tarn mast (1140 m)' }));
  fireEvent.click(screen.getByRole('button', { name: 'Set the neighbours' }));
  expect(await screen.findByText(/screened anew/)).toBeVisible();
  expect(sent).toEqual([{ path: '/api/towers/1/neighbours', towerIds: [2, 4] }]);
});

it('still shows a neighbour that was retired since', async () => {
  show([3]);
  expect(await screen.findByRole('checkbox', { name: 'Old mast (1130 m)' })).toBeChecked();
});

it('says what is refused beside the towers, and keeps what was chosen', async () => {
  const errors = [{ field: 'towerIds', text: 'There is no tower 4. Make the tower first.' }];
  show([], { code: 'invalid', detail: 'No.', errors });
  fireEvent.click(await screen.findByRole('checkbox', { name: 'Tarn mast (1140 m)' }));
  fireEvent.click(screen.getByRole('button', { name: 'Set the neighbours' }));
  expect(await screen.findByText('There is no tower 4. Make the tower first.')).toBeVisible();
  await waitFor(() => expect(screen.getByRole('checkbox', { name: 'Tarn mast (1140 m)' })).toBeChecked());
  expect(screen.queryByText(/screened anew/)).toBeNull();
});
