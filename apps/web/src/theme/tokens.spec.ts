import { readFileSync } from 'node:fs';
import path from 'node:path';
import { PALETTE, colorVar, type ColorName } from './palette';

const css = readFileSync(path.join(__dirname, 'tokens.css'), 'utf8');
const [light = '', dark = ''] = css.split(':root.dark');
const nameOf = (color: ColorName) => /--[\w-]+/.exec(colorVar(color))?.[0];

it.each(Object.keys(PALETTE) as ColorName[])('tokens.css says of %s what the palette says', (color) => {
  expect(light).toContain(`${nameOf(color)}: ${PALETTE[color].light.toLowerCase()};`);
  expect(dark).toContain(`${nameOf(color)}: ${PALETTE[color].dark.toLowerCase()};`);
});
