import { ChakraProvider } from '@chakra-ui/react';
import { fireEvent, render, screen } from '@testing-library/react';
import { system } from '../../../theme/system';
import { SetSpanDialog } from './set-span-dialog';

const span = {
  ...{ sensorId: 3, sensorName: 'T 30 m', said: 'failed' as const },
  ...{ from: '2026-01-15T09:10:00Z', to: '2026-01-15T13:00:00Z' },
};

function open(answer: { status: number; body: object }) {
  const asked = jest.fn((_path: string, _init: RequestInit) =>
    Promise.resolve(
      new Response(JSON.stringify(answer.body), {
        ...{ status: answer.status, headers: { 'content-type': 'application/json' } },
      }),
    ),
  );
  globalThis.fetch = asked as unknown as typeof fetch;
  const [onClose, onSet] = [jest.fn(), jest.fn()];
  render(
    <ChakraProvider value={system}>
      <SetSpanDialog span={span} zone="America/Boise" onClose={onClose} onSet={onSet} />
    </ChakraProvider>,
  );
  return { asked, onClose, onSet };
}
const press = () => fireEvent.click(screen.getByRole('button', { name: 'Set aside' }));

it('says what will happen, wants a reason, and sends it', async () => {
  const { asked, onClose, onSet } = open({ status: 201, body: { id: 1 } });
  expect(screen.getByRole('dialog', { name: 'Set aside T 30 m?' })).toHaveTextContent(
    /15 Jan 2026, 02:10 MST to that of 15 Jan 2026, 06:00 MST.*left out of every mean/,
  );
  press();
  expect(await screen.findByText('Say why in a few words: it stays in the record.')).toBeVisible();
  expect(asked).not.toHaveBeenCalled();
  fireEvent.change(screen.getByLabelText(/Reason/), { target: { value: ' cable loose ' } });
  press();
  await screen.findByRole('dialog');
  const sent = JSON.parse(String(asked.mock.calls[0]![1].body)) as object;
  expect(sent).toEqual({
    sensorId: 3,
    from: span.from,
    to: span.to,
    quality: 'failed',
    reason: 'cable loose',
  });
  expect([onSet.mock.calls.length, onClose.mock.calls.length]).toEqual([1, 1]);
});

it('keeps what was typed when it is refused', async () => {
  const { onClose } = open({
    status: 403,
    body: { detail: 'Your role does not allow it.', code: 'forbidden' },
  });
  fireEvent.change(screen.getByLabelText(/Reason/), { target: { value: 'cable loose' } });
  press();
  expect(await screen.findByText('Your role does not allow it.')).toBeVisible();
  expect(screen.getByLabelText(/Reason/)).toHaveValue('cable loose');
  expect(onClose).not.toHaveBeenCalled();
});
