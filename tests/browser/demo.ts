import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import { test as base, expect, type Page } from '@playwright/test';
import { type ServerProcess, startServer } from '../../scripts/server-process.ts';

const password = 'cut-once-measure-twice';

interface Demo {
  server: ServerProcess;
}

/** A demo club of its own for each worker, and pages whose console must stay silent. */
export const test = base.extend<{ quietPage: Page }, Demo>({
  server: [
    // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the fixtures from the pattern
    async ({}, use) => {
      const folder = mkdtempSync(join(tmpdir(), 'tallyloft-browser-'));
      const server = await startServer('demo', { DATA_DIR: join(folder, 'demo') });
      await use(server);
      await server.stop();
      rmSync(folder, { recursive: true, force: true });
    },
    { scope: 'worker', timeout: 120_000 },
  ],
  baseURL: async ({ server }, use) => use(server.url.replace('127.0.0.1', 'localhost')),
  quietPage: async ({ page }, use) => {
    const noises = listenToConsole(page);
    await use(page);
    expect(noises, 'console messages and page errors').toEqual([]);
  },
});

export { expect };

/** Collects what a page complains of. */
export function listenToConsole(page: Page): string[] {
  const noises: string[] = [];
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) noises.push(`${message.type()}: ${message.text()}`);
  });
  page.on('pageerror', (error) => noises.push(`page error: ${error.message}`));
  return noises;
}

export async function signIn(page: Page, name: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(`${name}@millrace.example`);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

export async function signOut(page: Page): Promise<void> {
  await page.goto('/account');
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.waitForURL(/\/sign-in/);
}

/** Axe finds nothing on the page once it has loaded. */
export async function expectAccessible(page: Page): Promise<void> {
  await page.getByRole('heading', { level: 1 }).first().waitFor();
  await expect(page.locator('[aria-busy=true]')).toHaveCount(0);
  const { violations } = await new AxeBuilder({ page }).analyze();
  const told = violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`,
  );
  expect(told, `axe on ${page.url()}`).toEqual([]);
}

/** Nothing hangs over the side of the screen. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const [content, screen] = await page.evaluate(() => [
    document.documentElement.scrollWidth,
    window.innerWidth,
  ]);
  expect(content, `width of ${page.url()}`).toBeLessThanOrEqual(screen ?? 0);
}
