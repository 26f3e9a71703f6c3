import { PALETTE, type ColorName } from './palette';

/** Relative luminance of an sRGB colour, WCAG 2.2 definition. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4)) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [darker, lighter] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (lighter + 0.05) / (darker + 0.05);
}

const TEXT_ON_GROUND: [ColorName, ColorName[]][] = [
  [
    'ink',
    ['paper', 'card', 'raised', 'airSoft', 'lidSoft', 'banSoft', 'advisorySoft', 'noneSoft', 'unknownSoft'],
  ],
  ['mute', ['paper', 'card', 'raised', 'airSoft', 'lidSoft']],
  ['air', ['paper', 'card', 'raised', 'airSoft']],
  ['onAir', ['air', 'airStrong']],
  ['lid', ['paper', 'card', 'lidSoft']],
  ['ground', ['paper', 'card']],
  ['none', ['card', 'noneSoft']],
  ['advisory', ['card', 'advisorySoft']],
  ['ban', ['paper', 'card', 'banSoft']],
  ['onBan', ['ban', 'banStrong']],
  ['suspended', ['card', 'suspendedSoft']],
  ['unknown', ['paper', 'card', 'unknownSoft']],
];

describe.each(['light', 'dark'] as const)('the palette in %s', (mode) => {
  const pairs = TEXT_ON_GROUND.flatMap(([text, grounds]) => grounds.map((ground) => [text, ground] as const));

  it.each(pairs)('lets %s be read on %s (WCAG 2.2, 1.4.3: 4.5:1)', (text, ground) => {
    expect(contrast(PALETTE[text][mode], PALETTE[ground][mode])).toBeGreaterThanOrEqual(4.5);
  });

  it.each(['card', 'paper'] as const)(
    'lets the edge of a control be seen on %s (WCAG 2.2, 1.4.11: 3:1)',
    (ground) => {
      expect(contrast(PALETTE.edge[mode], PALETTE[ground][mode])).toBeGreaterThanOrEqual(3);
    },
  );
});
