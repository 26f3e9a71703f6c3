import { chakra, Flex } from '@chakra-ui/react';
import { count } from '../../../lib/format/number';
import type { Import } from '../types';

const Figure = chakra('div', { base: { minW: '110px' } });
const Amount = chakra('div', { base: { fontSize: '2xl', fontWeight: '600', lineHeight: '1.1' } });
const What = chakra('div', { base: { color: 'mute', fontSize: 'sm' } });

const FIGURES: readonly { key: 'new' | 'repeated' | 'corrected' | 'refused'; what: string }[] = [
  { key: 'new', what: 'new readings' },
  { key: 'repeated', what: 'known already' },
  { key: 'corrected', what: 'corrected' },
  { key: 'refused', what: 'refused' },
];

/** How many readings of an import went which way. */
export function ImportCounts({ from }: { from: Import }) {
  return (
    <Flex gap="5" wrap="wrap">
      {FIGURES.map(({ key, what }) => (
        <Figure key={key}>
          <Amount>{count(from[key])}</Amount>
          <What>{what}</What>
        </Figure>
      ))}
    </Flex>
  );
}
