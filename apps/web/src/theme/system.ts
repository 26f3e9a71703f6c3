import { createSystem, mergeConfigs, type SystemConfig } from '@chakra-ui/react/styled-system';
import { defaultBaseConfig } from '@chakra-ui/react/preset-base';
import {
  animationStyles,
  breakpoints,
  keyframes,
  layerStyles,
  semanticTokens,
  textStyles,
  tokens,
} from '@chakra-ui/react/theme';
import { globalCss } from './global-css';
import { recipes, slotRecipes } from './recipes';
import { semanticColors } from './semantic-colors';

const SANS = '"Source Sans 3", system-ui, -apple-system, "Segoe UI", Roboto, Arial, sans-serif';
const size = (px: number) => ({ value: `${px / 16}rem` });

/** Few sizes of type, in rem so that the reader's own setting counts. */
const fontSizes = {
  xs: size(12.5),
  sm: size(14),
  md: size(16),
  lg: size(18),
  xl: size(21),
  '2xl': size(26),
  '3xl': size(32),
};

const config: SystemConfig = {
  preflight: true,
  cssVarsPrefix: 'chakra',
  cssVarsRoot: ':where(html)',
  globalCss,
  theme: {
    breakpoints,
    keyframes,
    tokens: {
      ...tokens,
      fonts: {
        body: { value: SANS },
        heading: { value: SANS },
        mono: tokens.fonts?.mono ?? { value: 'monospace' },
      },
      fontSizes: { ...tokens.fontSizes, ...fontSizes },
    },
    semanticTokens: {
      colors: semanticColors,
      shadows: semanticTokens.shadows,
      radii: { l1: { value: '4px' }, l2: { value: '8px' }, l3: { value: '10px' } },
    },
    recipes,
    slotRecipes,
    textStyles,
    layerStyles,
    animationStyles,
  },
};

/** The product's design system: Chakra's mechanics, our colours, type and the recipes we use. */
export const system = createSystem(mergeConfigs(defaultBaseConfig, config));
