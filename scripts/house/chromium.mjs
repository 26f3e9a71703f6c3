import { existsSync } from 'node:fs';
import { run } from './command.mjs';
import { Fault } from './fault.mjs';

const USUAL = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];
const HOW = 'Install Debian’s package chromium, or set CHROMIUM to the browser’s file.';

/** The browser for the tests: CHROMIUM, or a usual place, or installed from Debian when this user may. */
export async function ensureChromium() {
  const asked = process.env.CHROMIUM;
  if (asked) {
    if (existsSync(asked)) return asked;
    throw new Fault(`CHROMIUM is "${asked}", and there is no such file. ${HOW}`);
  }
  const found = USUAL.find(existsSync);
  if (found) return found;
  if (!existsSync('/etc/debian_version') || process.getuid?.() !== 0)
    throw new Fault(`There is no Chromium. ${HOW}`);
  console.log('Installing Chromium from Debian …');
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update'], { env, quiet: true });
  const { code, output } = await run('apt-get', ['install', '-y', '--no-install-recommends', 'chromium'], {
    env,
    quiet: true,
  });
  const made = USUAL.find(existsSync);
  if (code !== 0 || !made) throw new Fault(`${output.trimEnd()}\nChromium could not be installed. ${HOW}`);
  return made;
}
