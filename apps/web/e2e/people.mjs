import { chromium } from 'playwright-core';
import { watch } from './faults.mjs';

const QUIET = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** The browser with one window a person; every window's faults are collected. */
export async function openBrowser(baseURL) {
  const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium';
  const browser = await chromium.launch({ executablePath, args: QUIET });
  const faults = [];
  const open = async (viewport) => {
    const context = await browser.newContext({ viewport, baseURL, reducedMotion: 'reduce' });
    return watch(await context.newPage(), faults);
  };
  const people = {
    admin: await open({ width: 1440, height: 900 }),
    analyst: await open({ width: 1440, height: 900 }),
    officer: await open({ width: 390, height: 844 }),
    second: await open({ width: 1440, height: 900 }),
    resident: await open({ width: 390, height: 844 }),
  };
  return { people, faults, close: () => browser.close() };
}
