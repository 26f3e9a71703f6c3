import { defineSemanticTokens } from '@chakra-ui/react/styled-system';
import { PALETTE, type ColorName } from './palette';

const both = (name: ColorName) => ({ value: { _light: PALETTE[name].light, _dark: PALETTE[name].dark } });
const kebab = (name: string) => name.replace(/[A-Z]/g, (c) => `-${c.toLowerCase()}`);

/** The roles Chakra's own parts ask for in a colour palette, filled with one of ours. */
const palette = (main: ColorName, strong: ColorName, soft: ColorName, contrast: ColorName) => ({
  solid: both(main),
  contrast: both(contrast),
  fg: both(main),
  subtle: both(soft),
  muted: both(soft),
  emphasized: both(strong),
  focusRing: both('air'),
  border: both('edge'),
});

/** Our colours under their own names, and the same under the names Chakra's parts look for. */
export const semanticColors = defineSemanticTokens.colors({
  ...Object.fromEntries((Object.keys(PALETTE) as ColorName[]).map((name) => [kebab(name), both(name)])),
  bg: {
    DEFAULT: both('paper'),
    panel: both('card'),
    subtle: both('card'),
    muted: both('raised'),
    emphasized: both('line'),
  },
  fg: {
    DEFAULT: both('ink'),
    muted: both('mute'),
    subtle: both('mute'),
    error: both('ban'),
    inverted: both('card'),
  },
  border: { DEFAULT: both('line'), muted: both('line'), emphasized: both('edge'), error: both('ban') },
  gray: palette('ink', 'edge', 'raised', 'card'),
  blue: palette('air', 'airStrong', 'airSoft', 'onAir'),
  red: palette('ban', 'banStrong', 'banSoft', 'onBan'),
});
