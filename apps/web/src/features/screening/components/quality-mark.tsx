import { chakra } from '@chakra-ui/react';
import type { Quality } from '../types';
import { QUALITY_NAME } from '../words';

const Words = chakra('span', {
  base: { display: 'inline-flex', gap: '1.5', alignItems: 'center', fontWeight: '600', whiteSpace: 'nowrap' },
  variants: {
    quality: {
      valid: { color: 'none' },
      suspect: { color: 'lid' },
      failed: { color: 'ban' },
      missing: { color: 'unknown' },
    },
  },
});

const SHAPES: Record<Quality, string> = {
  valid: 'M2 6.5l3 3 5-7',
  suspect: 'M6 2l4.6 8H1.4z',
  failed: 'M2 2l8 8M10 2l-8 8',
  missing: 'M2 6h8',
};

/** The shape by which charts mark a quality. */
export function QualityShape({ quality }: { quality: Quality }) {
  return (
    <svg width="12" height="12" viewBox="0 0 12 12" aria-hidden="true">
      <path
        d={SHAPES[quality]}
        fill={quality === 'suspect' ? 'currentColor' : 'none'}
        stroke="currentColor"
        strokeWidth="2"
        strokeLinejoin="round"
      />
    </svg>
  );
}

/** A quality as word, shape and colour; `children` replaces the word. */
export function QualityMark({ quality, children }: { quality: Quality; children?: React.ReactNode }) {
  return (
    <Words quality={quality}>
      <QualityShape quality={quality} />
      {children ?? QUALITY_NAME[quality]}
    </Words>
  );
}
