import type { Source } from '../types';
import { entriesOf, layoutEntriesOf, pairsOf, toSource } from './source-entries';

const known = {
  kind: 'http',
  url: 'https://loggers.pellworth.example/mast.csv',
  auth: 'basic',
  hasSecret: true,
  intervalSeconds: 600,
  version: 4,
  mapping: {
    format: 'wide',
    separator: '\t',
    decimal: ',',
    timeColumn: 'time',
    timeColumns: [{ column: '1', part: 'day' }],
    timeForm: 'iso',
    columns: { 'T=2m': 't2' },
    clock: 'UTC',
  },
} as unknown as Source;

describe('the entries of a source', () => {
  it('give back what they came from, and what they do not show', () => {
    const sent = toSource(entriesOf(known), known);
    expect(sent).toMatchObject({
      url: known.url,
      auth: 'basic',
      intervalSeconds: 600,
      version: 4,
      mapping: { ...known.mapping, missing: ['NaN'] },
    });
    expect(sent).not.toHaveProperty('kind');
    expect(sent).not.toHaveProperty('password');
  });

  it('send of a kind what belongs to it', () => {
    const typed = {
      ...entriesOf(),
      path: 'mast',
      url: 'https://x.example',
      auth: 'bearer' as const,
      token: 't',
    };
    expect(toSource(typed)).toMatchObject({ kind: 'folder', path: 'mast', intervalSeconds: 60 });
    expect(toSource(typed)).not.toHaveProperty('url');
    expect(toSource({ ...typed, kind: 'http' })).toMatchObject({ url: 'https://x.example', token: 't' });
    expect(Object.keys(toSource({ ...typed, kind: 'push' })).sort()).toEqual(['kind', 'mapping']);
  });

  it('take over what an uploaded file has been read by', () => {
    const timeColumns = [{ column: '1', part: 'day' }];
    const layout = { separator: ';', timeColumns } as unknown as Source['mapping'];
    const typed = { ...entriesOf(), ...layoutEntriesOf(layout) };
    expect(toSource(typed, undefined, layout)).toMatchObject({ mapping: { separator: ';', timeColumns } });
  });

  it('read pairs a line, the last "=" dividing', () => {
    expect(pairsOf('columns', 'T (2 m) = t2\n\nRH=%=rh\n')).toEqual({ 'T (2 m)': 't2', 'RH=%': 'rh' });
    for (const line of ['nothing', '= t2', 't2 =']) {
      const refused = expect.objectContaining({ errors: [expect.objectContaining({ field: 'units' })] });
      expect(() => pairsOf('units', line)).toThrow(refused);
    }
  });
});
