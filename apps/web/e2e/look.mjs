import { mkdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import { sure } from './steps.mjs';
import { until } from './until.mjs';

/** Run as an expression, for the pages' own policy takes no script element that is not theirs. */
const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
/** All of WCAG 2.2 A and AA in light; in dark, where only the colours are others, the rules about colour. */
const AXE_RULES = {
  light: { type: 'tag', values: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'] },
  dark: { type: 'rule', values: ['color-contrast', 'link-in-text-block'] },
};
const NARROW_PX = [390, 320];
const dressed = (colorScheme) => ({ colorScheme, reducedMotion: 'reduce' });

/**
 * Looks at a page in light and dark: no accessibility violation (axe, WCAG 2.2 A and AA), and nothing wider than a
 * window of 390 and 320 px; keeps a picture of each in JOURNEY_SHOTS.
 */
export async function look(page, name) {
  const { width } = page.viewportSize();
  for (const colorScheme of ['light', 'dark']) {
    await page.emulateMedia(dressed(colorScheme));
    const shown = () => page.evaluate(() => document.documentElement.classList.contains('dark'));
    await until(
      `${name} shows itself ${colorScheme}`,
      async () => (await shown()) === (colorScheme === 'dark'),
      5_000,
    );
    await atRest(page);
    await keepPicture(page, `${name}-${width}-${colorScheme}`);
    const found = await violations(page, colorScheme);
    sure(found.length === 0, `${name} in ${colorScheme} is open to everybody (axe):\n${found.join('\n')}`);
  }
  await page.emulateMedia(dressed('light'));
  await fits(page, name);
}

/** Keeps a picture of the whole page in the folder JOURNEY_SHOTS, if that is set. */
export async function keepPicture(page, name, folder = process.env.JOURNEY_SHOTS) {
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: path.join(folder, `${name}.png`), fullPage: true });
}

/** What axe finds wrong, one line a rule. */
async function violations(page, colorScheme) {
  if (!(await page.evaluate(() => 'axe' in globalThis))) await page.evaluate(axeSource);
  const found = await page.evaluate(
    (runOnly) => globalThis.axe.run(document, { runOnly, resultTypes: ['violations'] }),
    AXE_RULES[colorScheme],
  );
  return found.violations.map(
    ({ id, nodes }) =>
      `${id}: ${nodes.map(({ target, failureSummary }) => `${target} ${failureSummary}`).join('; ')}`,
  );
}

/** Nothing is wider than the window, at the page's own width and on phones. */
async function fits(page, name) {
  const size = page.viewportSize();
  for (const width of new Set([size.width, ...NARROW_PX])) {
    await page.setViewportSize({ ...size, width });
    const overhang = () =>
      page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
    await until(
      `${name} is no wider than a window of ${width} px`,
      async () => (await overhang()) <= 0,
      5_000,
    );
  }
  await page.setViewportSize(size);
}

/** Waits until fonts are there and every change of colour or place has come to its end. */
async function atRest(page) {
  await page.evaluate(async () => {
    await document.fonts.ready;
    await new Promise((resolve) =>
      globalThis.requestAnimationFrame(() => globalThis.requestAnimationFrame(resolve)),
    );
    const finite = document
      .getAnimations()
      .filter((each) => Number.isFinite(each.effect?.getComputedTiming().endTime));
    await Promise.allSettled(finite.map(({ finished }) => finished));
  });
}
