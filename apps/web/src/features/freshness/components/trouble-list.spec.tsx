import { ChakraProvider } from '@chakra-ui/react';
import { render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { ClockContext } from '../../../lib/clock';
import { system } from '../../../theme/system';
import type { Trouble } from '../api';
import { TroubleList } from './trouble-list';

const late: Trouble = {
  ...{
    id: 1,
    towerId: 4,
    towerName: 'Valley mast',
    kind: 'late',
    text: 'Valley mast is late. Look at its link.',
  },
  ...{ since: '2026-01-16T00:00:00Z', seenAt: '2026-01-16T00:46:00Z', toldAt: '2026-01-16T00:51:00Z' },
  ...{ mailsAccepted: 1, mailsNotAccepted: 1, endedAt: null },
};

function show(troubles: Trouble[]) {
  globalThis.fetch = jest.fn(() =>
    Promise.resolve(
      new Response(JSON.stringify(troubles), { headers: { 'content-type': 'application/json' } }),
    ),
  ) as unknown as typeof fetch;
  render(
    <ChakraProvider value={system}>
      <ClockContext value={() => Date.parse('2026-01-16T01:00:00Z')}>
        <SWRConfig value={{ provider: () => new Map() }}>
          <MemoryRouter>
            <TroubleList zone="UTC" />
          </MemoryRouter>
        </SWRConfig>
      </ClockContext>
    </ChakraProvider>,
  );
}

it('names the tower, what is wrong, what to look at and who was told', async () => {
  show([late]);
  expect(await screen.findByRole('link', { name: 'Valley mast' })).toHaveAttribute(
    'href',
    '/readings/towers/4',
  );
  expect(screen.getByText('Late')).toBeVisible();
  expect(screen.getByText(late.text)).toBeVisible();
  expect(screen.getByText('1 of 2 mails accepted')).toBeVisible();
});

it('says of a trouble that is over since when, and when there is none', async () => {
  show([{ ...late, endedAt: '2026-01-16T00:56:00Z' }]);
  expect(await screen.findByText('4 min ago')).toBeVisible();
  show([]);
  expect(await screen.findByText('No tower is in trouble')).toBeVisible();
});
