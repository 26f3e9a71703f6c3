/** Numbers in [0, 1) that a seed gives again and again (mulberry32, a public-domain generator). */
export function chances(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296;
  };
}

type Chance = () => number;
type Mutation = (text: string, chance: Chance) => string;

const pick = <T>(from: readonly T[], chance: Chance): T => from[Math.floor(chance() * from.length)]!;
const at = (text: string, chance: Chance): number => Math.floor(chance() * (text.length + 1));
const splice = (text: string, place: number, removed: number, put: string): string =>
  text.slice(0, place) + put + text.slice(place + removed);

/** Cells that loggers, spreadsheets and people have been seen to write. */
const CELLS = [
  ...[
    '',
    ' ',
    '-',
    '--',
    '.',
    '-.5',
    '5.',
    '+7',
    '1e309',
    '-1e309',
    '1e-400',
    '0x10',
    '1_000',
    '1,5',
    '1.2.3',
    '1 000',
  ],
  ...[
    '１２',
    '−5',
    '٣',
    '–5',
    '=A1+1',
    '#N/A',
    'NaN',
    'Infinity',
    'null',
    'true',
    '-9999',
    '9'.repeat(400),
    '1e',
    'e5',
  ],
  ...[
    '"5"',
    '"5',
    '5"',
    '""',
    "'5",
    '5\u0000',
    '\u202e5',
    '\ufeff5',
    '5\u00a0',
    '🌡',
    '14.0 °F',
    '0b1',
    '1d3',
    '08',
    '-0',
  ],
];
const TIMES = [
  ...[
    '1899-12-30 00:00',
    '2999-01-01 00:00',
    '2026-02-30 05:00',
    '2026-01-10 24:00',
    '2026-01-10 24:01',
    '2026-01-10 05:00:60',
  ],
  ...[
    '0000-01-10 05:00',
    '2026-01-10 05:00+15:00',
    '2026-01-10 05:00-99:00',
    '2026-13-01 05:00',
    '10/01/2026 05:00',
    '',
  ],
  ...[
    '2026-01-10T05:00:00.999Z',
    '20260110T0500',
    '2026-01-10',
    '05:00',
    '46032.2083',
    '1768021200',
    '2026-1-9 5:00',
    '２０２６-01-10 05:00',
  ],
];
const onLine =
  (change: (cells: string[], chance: Chance) => string[]): Mutation =>
  (text, chance) => {
    const lines = text.split('\n');
    const i = Math.floor(chance() * lines.length);
    lines[i] = change(lines[i]!.split(','), chance).join(',');
    return lines.join('\n');
  };
const setCell = (cells: string[], place: number, cell: string): string[] =>
  cells.map((each, i) => (i === place ? cell : each));

const MUTATIONS: readonly Mutation[] = [
  (text, chance) => splice(text, at(text, chance), 1, ''),
  (text, chance) => splice(text, at(text, chance), 1, String.fromCharCode(Math.floor(chance() * 256))),
  (text, chance) =>
    splice(
      text,
      at(text, chance),
      0,
      pick(['"', ',', ';', '\t', '\r', '\n', '\u2028', '\ufeff', '-', '.', '0'], chance),
    ),
  (text, chance) => text.slice(0, at(text, chance)),
  (text, chance) => text.slice(at(text, chance)),
  (text, chance) => splice(text, at(text, chance), 0, text.slice(at(text, chance), at(text, chance) + 40)),
  onLine((cells, chance) => setCell(cells, Math.floor(chance() * cells.length), pick(CELLS, chance))),
  onLine((cells, chance) => setCell(cells, 0, pick(TIMES, chance))),
  onLine((cells, chance) => [...cells, pick(cells, chance)]),
  onLine((cells) => cells.slice(1)),
  onLine((cells) => [...cells].reverse()),
  (text, chance) => text.replaceAll(',', pick([';', '\t', ' ', ',,', '|'], chance)),
  (text, chance) => text.replaceAll('\n', pick(['\r\n', '\r', '\n\n', '\n\r'], chance)),
  (text) => text.replaceAll('.', ','),
  (text) => `\ufeff${text}`,
  (text, chance) => {
    const lines = text.split('\n');
    const line = pick(lines, chance);
    lines.splice(Math.floor(chance() * lines.length), 0, line);
    return lines.join('\n');
  },
  (text) => {
    const [head = '', ...rest] = text.split('\n');
    return [head, ...rest.reverse()].join('\n');
  },
];

/** A file with one to four things wrong with it; the same seed gives the same file. */
export function mutate(text: string, seed: number): string {
  const chance = chances(seed);
  let mutated = text;
  for (let left = 1 + Math.floor(chance() * 4); left > 0; left--)
    mutated = pick(MUTATIONS, chance)(mutated, chance);
  return mutated;
}
