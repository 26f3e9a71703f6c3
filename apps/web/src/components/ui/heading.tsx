import { chakra } from '@chakra-ui/react';

const base = { fontWeight: '600', letterSpacing: '-0.01em', lineHeight: '1.2', margin: 0 } as const;

/** The title of a page, once each. */
export const PageTitle = chakra('h1', { base: { ...base, fontSize: { base: 'xl', md: '2xl' } } });
/** The title of a card or a part. */
export const PartTitle = chakra('h2', { base: { ...base, fontSize: 'lg' } });
/** The title within a part. */
export const SmallTitle = chakra('h3', { base: { ...base, fontSize: 'md' } });
/** Secondary text. */
export const Muted = chakra('span', {
  base: { color: 'mute' },
  variants: { small: { true: { fontSize: 'sm' } } },
});
