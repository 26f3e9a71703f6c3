import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** A column: its head, and what it says of a row. */
export interface Column<Row> {
  head: string;
  cell: (row: Row) => ReactNode;
  numeric?: boolean;
}

interface PlainTableProps<Row> {
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string | number;
}

const Cell = chakra('td', {
  base: {
    display: { base: 'flex', md: 'table-cell' },
    justifyContent: 'space-between',
    gap: '4',
    px: '3',
    py: { base: '1', md: '2' },
    borderTopWidth: { base: '0', md: '1px' },
    borderColor: 'line',
    verticalAlign: 'top',
    overflowWrap: 'anywhere',
  },
  variants: { numeric: { true: { textAlign: { md: 'end' }, whiteSpace: 'nowrap' } } },
});
const Head = chakra('th', {
  base: { px: '3', py: '2', fontSize: 'sm', fontWeight: '600', color: 'mute', textAlign: 'start' },
  variants: { numeric: { true: { textAlign: 'end' } } },
});
const Row = chakra('tr', {
  base: {
    display: { base: 'block', md: 'table-row' },
    py: { base: '2', md: '0' },
    borderTopWidth: { base: '1px', md: '0' },
    borderColor: 'line',
  },
});
const OnPhone = chakra('span', { base: { display: { md: 'none' }, color: 'mute', flex: 'none' } });

/** A table of records; on a phone each row is a small sheet of its own with the heads beside the values. */
export function PlainTable<T>({ caption, columns, rows, keyOf }: PlainTableProps<T>) {
  return (
    <chakra.table width="100%" borderCollapse="collapse" display={{ base: 'block', md: 'table' }}>
      <chakra.caption srOnly>{caption}</chakra.caption>
      <chakra.thead display={{ base: 'none', md: 'table-header-group' }}>
        <tr>
          {columns.map(({ head, numeric }) => (
            <Head key={head} numeric={numeric ?? false} scope="col">
              {head}
            </Head>
          ))}
        </tr>
      </chakra.thead>
      <chakra.tbody display={{ base: 'block', md: 'table-row-group' }}>
        {rows.map((row) => (
          <Row key={keyOf(row)}>
            {columns.map(({ head, cell, numeric }) => (
              <Cell key={head} numeric={numeric ?? false}>
                <OnPhone aria-hidden="true">{head}</OnPhone>
                <chakra.span minW="0">{cell(row)}</chakra.span>
              </Cell>
            ))}
          </Row>
        ))}
      </chakra.tbody>
    </chakra.table>
  );
}
