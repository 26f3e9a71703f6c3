import { defineGlobalStyles } from '@chakra-ui/react/styled-system';

/** What holds on every staff page: paper and ink, tabular figures, a focus that is seen, stillness where asked for. */
export const globalCss = defineGlobalStyles({
  html: { bg: 'paper', color: 'ink', lineHeight: '1.45', colorPalette: 'blue' },
  body: {
    margin: 0,
    minWidth: '320px',
    fontFamily: 'body',
    fontSize: 'md',
    fontVariantNumeric: 'tabular-nums',
    textRendering: 'optimizeLegibility',
  },
  ':focus-visible': {
    outline: '2px solid var(--chakra-colors-air)',
    outlineOffset: '2px',
    borderRadius: '4px',
  },
  '::selection': { bg: 'air-soft' },
  '::placeholder': { color: 'mute', opacity: 1 },
  '*, *::before, *::after': {
    '@media (prefers-reduced-motion: reduce)': {
      animationDuration: '0.01ms !important',
      animationIterationCount: '1 !important',
      transitionDuration: '0.01ms !important',
    },
  },
  '[data-screen-only]': { _print: { display: 'none !important' } },
});
