import type { Source } from '../types';
import { sourceState, type SourceState } from './source-state';

const now = Date.parse('2026-01-16T01:00:00Z');
const at = (minutes: number) => new Date(now + minutes * 60_000).toISOString();
const source: Source = {
  id: 1,
  towerId: 1,
  kind: 'folder',
  path: 'mast',
  url: null,
  auth: 'none',
  hasSecret: false,
  mapping: {} as Source['mapping'],
  intervalSeconds: 300,
  collecting: false,
  lastAt: at(-3),
  lastOkAt: at(-3),
  lastResult: '12 new readings.',
  failures: 0,
  failingSince: null,
  nextAt: at(2),
  version: 1,
};

describe('how a source stands', () => {
  it.each<[Partial<Source>, SourceState]>([
    [{}, { tone: 'fine', text: 'Collected 3 min ago: 12 new readings. Next at 18:02 MST.' }],
    [
      { lastResult: 'Not changed since the last time.', nextAt: at(-1) },
      { tone: 'fine', text: 'Collected 3 min ago: not changed since the last time. Next: now.' },
    ],
    [
      { nextAt: at(20 * 60) },
      { tone: 'fine', text: 'Collected 3 min ago: 12 new readings. Next at Fri 16 Jan, 14:00 MST.' },
    ],
    [
      { lastAt: null, nextAt: null },
      { tone: 'quiet', text: 'Not collected yet: that happens within half a minute.' },
    ],
    [{ collecting: true }, { tone: 'quiet', text: 'Being collected now.' }],
    [{ kind: 'push' }, { tone: 'quiet', text: 'The site sends its readings with a key, see below.' }],
    [
      { failures: 1, failingSince: at(-3), lastOkAt: null, lastResult: '"mast" is not there.' },
      {
        tone: 'failing',
        title: 'Failing since 17:57 MST, tried once',
        text: '"mast" is not there. It is tried again at 18:02 MST. It has never worked so far.',
      },
    ],
    [
      { failures: 9, failingSince: at(-45 * 60), lastOkAt: at(-46 * 60), lastResult: 'Gone.', nextAt: null },
      {
        tone: 'failing',
        title: 'Failing since Tue 13 Jan, 21:00 MST, tried 9 times',
        text: 'Gone. It is tried again now. It last worked 46 h ago.',
      },
    ],
  ])('%j', (change, state) => {
    expect(sourceState({ ...source, ...change }, 'America/Denver', now)).toEqual(state);
  });
});
