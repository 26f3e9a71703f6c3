import { ChakraProvider } from '@chakra-ui/react';
import { render, screen, within } from '@testing-library/react';
import { system } from '../../../theme/system';
import type { TowerCalendar } from '../types';
import { CalendarGrid } from './calendar-grid';

const sensor = (sensorId: number, name: string) =>
  ({ sensorId, name, quantity: 'air temperature', unit: '°C', heightM: sensorId }) as const;
const day = (date: string, failed: number): TowerCalendar['days'][number] => ({
  ...{ day: date, from: `${date}T07:00:00Z`, to: `${date}T07:00:00Z` },
  sensors: [
    { sensorId: 2, expected: 144, taken: 144, suspect: 0, failed, completenessPercent: 97.9 },
    { sensorId: 10, expected: 144, taken: 0, suspect: 0, failed: 0, completenessPercent: 0 },
  ],
});
const calendar: TowerCalendar = {
  ...{ towerId: 1, timeZone: 'America/Boise', sensors: [sensor(2, 'T 2 m'), sensor(10, 'T 10 m')] },
  days: [day('2026-01-14', 0), day('2026-01-15', 3)],
};

it('says every day of every sensor in words, and shows the day that is chosen', () => {
  const onDay = jest.fn();
  render(
    <ChakraProvider value={system}>
      <CalendarGrid calendar={calendar} chosen={['2026-01-15']} onDay={onDay} />
    </ChakraProvider>,
  );
  const table = screen.getByRole('table', { name: 'Completeness of each day by sensor' });
  const row = within(table).getByRole('row', { name: /^T 2 m/ });
  expect(
    within(row)
      .getAllByRole('cell')
      .map((cell) => cell.textContent),
  ).toEqual(['97.9 %', '97.9 %, 3 failed']);
  expect(within(table).getAllByText('no readings')).toHaveLength(2);
  expect(screen.getByRole('button', { name: 'Show Thu 15 Jan' })).toHaveAttribute('aria-pressed', 'true');
  screen.getByRole('button', { name: 'Show Wed 14 Jan' }).click();
  expect(onDay).toHaveBeenCalledWith('2026-01-14');
});
