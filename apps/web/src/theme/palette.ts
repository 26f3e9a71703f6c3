/** One colour in light and in dark. */
export interface ModeColor {
  readonly light: string;
  readonly dark: string;
}

/**
 * Every colour of the product, named by meaning. Three ideas carry the look: cool blue for air, copper for the lid,
 * brown for the ground; on warm paper in light, on deep slate in dark. Each text colour has a contrast of at least
 * 4.5:1 on the grounds it is used on (`palette.spec.ts`).
 */
export const PALETTE = {
  paper: { light: '#FAF8F4', dark: '#11171E' },
  card: { light: '#FFFFFF', dark: '#18212A' },
  raised: { light: '#F3F0E9', dark: '#202B36' },
  ink: { light: '#1E2630', dark: '#E9EDF1' },
  mute: { light: '#5A6472', dark: '#A3AFBB' },
  line: { light: '#DED9CF', dark: '#2C3945' },
  edge: { light: '#8A8478', dark: '#6B7B8A' },
  air: { light: '#1C5D78', dark: '#7CC0DA' },
  airStrong: { light: '#144A61', dark: '#9AD2E7' },
  airSoft: { light: '#E3EEF2', dark: '#1B313C' },
  onAir: { light: '#FFFFFF', dark: '#0E1A20' },
  lid: { light: '#A8501F', dark: '#E99A62' },
  lidSoft: { light: '#F6E7DC', dark: '#3A291D' },
  ground: { light: '#6B5E50', dark: '#A6978A' },
  none: { light: '#336450', dark: '#8CCBAA' },
  noneSoft: { light: '#E7F0EA', dark: '#1B3128' },
  advisory: { light: '#7A5200', dark: '#F0C560' },
  advisorySoft: { light: '#FCEFCB', dark: '#3A2E10' },
  ban: { light: '#8C1D2F', dark: '#F29AA4' },
  banStrong: { light: '#701625', dark: '#F7B4BC' },
  banSoft: { light: '#F9E3E3', dark: '#41191F' },
  onBan: { light: '#FFFFFF', dark: '#1B0B0D' },
  suspended: { light: '#4B3F8F', dark: '#B9AEF0' },
  suspendedSoft: { light: '#EAE7F6', dark: '#2A2548' },
  unknown: { light: '#545C66', dark: '#B4BCC6' },
  unknownSoft: { light: '#ECEDEF', dark: '#2A323B' },
} as const satisfies Record<string, ModeColor>;

/** The name of a colour of the product. */
export type ColorName = keyof typeof PALETTE;

/** The CSS custom property in which a colour lives, for drawings outside Chakra's style props. */
export const colorVar = (name: ColorName): string =>
  `var(--chakra-colors-${name.replace(/[A-Z]/g, (c) => `-${c.toLowerCase()}`)})`;
