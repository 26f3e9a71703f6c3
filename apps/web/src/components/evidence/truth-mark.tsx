import { HStack } from '@chakra-ui/react';
import type { Truth } from '../../lib/api/types';

const WORDS: Record<Truth, string> = { true: 'met', false: 'not met', 'not known': 'not known' };
const SHAPES: Record<Truth, string> = {
  true: 'M2 6.5l3 3 5-7',
  false: 'M2.5 2.5l7 7M9.5 2.5l-7 7',
  'not known': 'M2 6h1.6M5.2 6h1.6M8.4 6H10',
};

const COLORS: Record<Truth, string> = { true: 'air', false: 'ink', 'not known': 'unknown' };

/** Met, not met or not known: word, shape and colour. */
export function TruthMark({ truth }: { truth: Truth }) {
  return (
    <HStack
      as="span"
      display="inline-flex"
      gap="1.5"
      fontWeight="600"
      whiteSpace="nowrap"
      color={COLORS[truth]}
    >
      <svg
        width="12"
        height="12"
        viewBox="0 0 12 12"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.9"
        aria-hidden="true"
      >
        <path d={SHAPES[truth]} />
      </svg>
      {WORDS[truth]}
    </HStack>
  );
}
