import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium } from '@playwright/test';
import { findChromium } from './find-chromium.ts';
import { startServer } from './server-process.ts';

// npm run pictures: the README's pictures, taken from the running demo.

const pictures = [
  { file: 'loft.png', path: '/' },
  { file: 'sheet.png', path: '/designs/shank-drawer-eighteen-bits' },
];

const folder = mkdtempSync(join(tmpdir(), 'tallyloft-pictures-'));
const server = await startServer('demo', { DATA_DIR: join(folder, 'demo') });
const browser = await chromium.launch({
  executablePath: findChromium(),
  args: ['--no-sandbox', '--disable-gpu', '--no-first-run', '--disable-background-networking'],
});
const page = await browser.newPage({ viewport: { width: 1280, height: 860 }, colorScheme: 'light' });
await page.goto(`${server.url.replace('127.0.0.1', 'localhost')}/sign-in`);
await page.getByLabel('E-mail').fill('wren@millrace.example');
await page.getByLabel('Password').fill('cut-once-measure-twice');
await page.getByRole('button', { name: 'Sign in' }).click();
await page.waitForURL((url) => url.pathname === '/');
mkdirSync('docs/pictures', { recursive: true });
for (const { file, path } of pictures) {
  await page.goto(new URL(path, page.url()).href);
  await page.getByRole('heading', { level: 1 }).first().waitFor();
  await page.waitForLoadState('networkidle');
  await page.screenshot({ path: join('docs/pictures', file) });
}
await browser.close();
await server.stop();
rmSync(folder, { recursive: true, force: true });
