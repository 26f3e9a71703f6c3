import { defineRecipe } from '@chakra-ui/react/styled-system';

/** How buttons look; four kinds, three sizes, at least 40 px high where a thumb presses. */
export const buttonRecipe = defineRecipe({
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    justifyContent: 'center',
    gap: '2',
    flexShrink: 0,
    font: 'inherit',
    fontWeight: '600',
    lineHeight: '1.2',
    textAlign: 'center',
    textDecoration: 'none',
    borderRadius: 'l2',
    borderWidth: '1px',
    cursor: 'pointer',
    transition: 'background-color 120ms, border-color 120ms',
    _disabled: { opacity: 0.55, cursor: 'not-allowed' },
  },
  variants: {
    kind: {
      go: {
        bg: 'air',
        borderColor: 'air',
        color: 'on-air',
        _hover: { bg: 'air-strong', borderColor: 'air-strong' },
      },
      plain: { bg: 'card', borderColor: 'edge', color: 'ink', _hover: { bg: 'raised' } },
      stop: {
        bg: 'ban',
        borderColor: 'ban',
        color: 'on-ban',
        _hover: { bg: 'ban-strong', borderColor: 'ban-strong' },
      },
      quiet: { bg: 'transparent', borderColor: 'transparent', color: 'air', _hover: { bg: 'air-soft' } },
    },
    size: {
      sm: { minH: '8', px: '3', fontSize: 'sm' },
      md: { minH: '10', px: '4', py: '2' },
      lg: { minH: '12', px: '5', py: '3', fontSize: 'lg' },
    },
    wide: { true: { width: '100%' } },
  },
  defaultVariants: { kind: 'plain', size: 'md' },
});
