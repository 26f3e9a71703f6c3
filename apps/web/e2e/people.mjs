import { mkdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import { chromium } from 'playwright-core';
import { sure } from './steps.mjs';
import { until } from './until.mjs';

/** Run as an expression, for the pages' own policy takes no script element that is not theirs. */
const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const AXE_RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
const QUIET = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Answers that belong to a step (nobody is signed in yet; the second of two is told), not faults of the page. */
const EXPECTED = [/\/api\/auth\/me$/, /\/api\/proposals\/\d+\/(confirm|issue)$/];

/** The browser with one window a person; every window's faults are collected. */
export async function openBrowser(baseUrl) {
  const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium';
  const browser = await chromium.launch({ executablePath, args: QUIET });
  const faults = [];
  /** A window of somebody's own; `phone` is 390 px wide. */
  const person = async ({ phone = false } = {}) => {
    const viewport = phone ? { width: 390, height: 844 } : { width: 1440, height: 900 };
    const context = await browser.newContext({ viewport, baseURL: baseUrl, reducedMotion: 'reduce' });
    const page = await context.newPage();
    page.on('pageerror', (error) => faults.push(`${page.url()}: ${error.message}`));
    page.on('console', (message) => {
      const network = message.text().startsWith('Failed to load resource');
      if (['error', 'warning'].includes(message.type()) && !network)
        faults.push(`${page.url()}: ${message.text()}`);
    });
    page.on('response', (answer) => {
      const { pathname } = new URL(answer.url());
      if (answer.status() >= 400 && !EXPECTED.some((each) => each.test(pathname)))
        faults.push(`${answer.status()} ${answer.request().method()} ${pathname}`);
    });
    return page;
  };
  return { browser, person, faults, close: () => browser.close() };
}

/**
 * Looks at a page in light and dark: no accessibility violation (axe, WCAG A and AA), nothing wider than the window,
 * also at 320 px; keeps a picture of each in JOURNEY_SHOTS.
 */
export async function look(page, name) {
  const size = page.viewportSize();
  for (const colorScheme of ['light', 'dark']) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    await atRest(page);
    await page.evaluate(axeSource);
    const { violations } = await page.evaluate(
      (values) => globalThis.axe.run(document, { runOnly: { type: 'tag', values } }),
      AXE_RULES,
    );
    const said = violations.map(
      ({ id, nodes }) =>
        `${id}: ${nodes.map(({ target, failureSummary }) => `${target} ${failureSummary}`).join('; ')}`,
    );
    sure(said.length === 0, `${name} in ${colorScheme} has no accessibility violation: ${said.join('\n')}`);
    await keepPicture(page, `${name}-${size.width}-${colorScheme}`);
  }
  await page.emulateMedia({ colorScheme: 'light', reducedMotion: 'reduce' });
  for (const width of new Set([size.width, 320])) {
    await page.setViewportSize({ ...size, width });
    const isIt = () => page.evaluate(() => document.documentElement.scrollWidth <= globalThis.innerWidth);
    await until(`${name} is no wider than a window of ${width} px`, isIt, 5_000);
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

/** Keeps a picture of the whole page in the folder JOURNEY_SHOTS, if that is set. */
export async function keepPicture(page, name) {
  const folder = process.env.JOURNEY_SHOTS;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: path.join(folder, `${name}.png`), fullPage: true });
}
