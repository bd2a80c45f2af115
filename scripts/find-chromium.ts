import { execFileSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { userInfo } from 'node:os';

const usualPlaces = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
  '/opt/google/chrome/chrome',
  '/snap/bin/chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
];

/** The browser for the browser tests: named, found, or (on Debian, as root) installed. */
export function findChromium(): string {
  const named = process.env['CHROMIUM_PATH'];
  if (named !== undefined && named !== '') {
    if (existsSync(named)) return named;
    throw new Error(`CHROMIUM_PATH names ${named}, which does not exist.`);
  }
  const found = usualPlaces.find((path) => existsSync(path));
  if (found !== undefined) return found;
  if (existsSync('/usr/bin/apt-get') && userInfo().uid === 0) {
    process.stdout.write('Installing Chromium for the browser tests …\n');
    const environment = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    execFileSync('apt-get', ['update', '-qq'], { stdio: 'inherit', env: environment });
    execFileSync('apt-get', ['install', '-y', '-qq', 'chromium'], { stdio: 'inherit', env: environment });
    return '/usr/bin/chromium';
  }
  throw new Error(
    'The browser tests need Chromium: install it (on Debian: apt-get install chromium), or set CHROMIUM_PATH to it.',
  );
}
