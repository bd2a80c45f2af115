import type { Browser, Page } from '@playwright/test';
import { expect, expectAccessible, expectNoSidewaysScroll, listenToConsole, signIn, test } from './demo.ts';
import { clampBlock, giveDrawing, takePackage, tellSettings } from './share-steps.ts';

/** Somebody of the club with a browser of their own. */
async function member(browser: Browser, baseURL: string | undefined, name: string, width: number) {
  const context = await browser.newContext({
    ...(baseURL === undefined ? {} : { baseURL }),
    viewport: { width, height: 900 },
  });
  const page = await context.newPage();
  const noises = listenToConsole(page);
  await signIn(page, name);
  return { page, noises };
}

async function look(page: Page): Promise<void> {
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
}

for (const width of [1440, 360]) {
  test(`share, find, fit, take, record, remix, flag, withhold, and the taker sees it (${width} px)`, async ({
    browser,
    baseURL,
  }) => {
    test.setTimeout(300_000);
    const title = `Story block ${width}`;
    const address = `/designs/story-block-${width}`;
    // A drawing of its own for each run of the story: a withheld one is known by its geometry and refused.
    const lengthMm = 90 + (width % 7);

    const tarn = await member(browser, baseURL, 'tarn', width);
    await tarn.page.goto('/share');
    await giveDrawing(tarn.page, clampBlock(lengthMm), `${lengthMm}.0 × 48.0 mm`);
    await tarn.page.getByLabel('Title').fill(title);
    await tarn.page.getByLabel('Kind').selectOption('hold-downs');
    await tarn.page.getByRole('radio', { name: /CC BY-SA 4\.0/ }).check();
    await tellSettings(tarn.page);
    await tarn.page.getByLabel('Feed', { exact: true }).fill('1500');
    await tarn.page.getByRole('button', { name: 'Publish in the loft' }).click();
    await tarn.page.waitForURL(`**${address}`);

    // Find, fit, take.
    const wren = await member(browser, baseURL, 'wren', width);
    await wren.page.goto(`/?q=${encodeURIComponent(title)}`);
    await wren.page.getByRole('link', { name: title, exact: true }).click();
    await wren.page.waitForURL(`**${address}**`);
    await expect(wren.page.getByText(/Fits your bed as drawn/).first()).toBeVisible();
    await takePackage(wren.page);

    // Record: the settings are filled in already.
    await wren.page.getByRole('link', { name: 'Record a cut' }).first().click();
    await wren.page.waitForURL(`**${address}/record**`);
    await look(wren.page);
    await wren.page.getByRole('radio', { name: /^Clean/ }).check();
    await wren.page.getByLabel('Run time').fill('16');
    await wren.page.getByRole('button', { name: 'Record the cut' }).click();
    await wren.page.waitForURL((url) => url.pathname === address);
    await expect(wren.page.getByText('proven', { exact: true }).first()).toBeVisible();
    await look(wren.page);
    await wren.page.goto('/log');
    await expect(wren.page.getByText(title).first()).toBeVisible();

    // Remix, under the only licence that share-alike leaves.
    await wren.page.goto(address);
    await wren.page.getByRole('link', { name: 'Remix this' }).click();
    await wren.page.waitForURL('**/share?**');
    await giveDrawing(wren.page, clampBlock(120), '120.0 × 48.0 mm');
    await wren.page.getByLabel('Title').fill(`${title}, longer`);
    await wren.page.getByLabel(/Change note|What changed/).fill('24 mm longer');
    await wren.page.getByRole('radio', { name: /CC BY-SA 4\.0/ }).check();
    await wren.page.getByRole('radio', { name: /Not cut yet/ }).check();
    await look(wren.page);
    await wren.page.getByRole('button', { name: /Publish/ }).click();
    await wren.page.waitForURL(`**${address}-longer`);
    await expect(wren.page.getByRole('link', { name: new RegExp(title) }).first()).toBeVisible();
    await look(wren.page);

    // Flag.
    await wren.page.goto(address);
    await wren.page.getByRole('button', { name: 'Flag this' }).click();
    await wren.page.getByRole('dialog').getByLabel('Reason').fill('The block split along the hole.');
    await look(wren.page);
    await wren.page.getByRole('dialog').getByRole('button', { name: 'Flag it' }).click();
    await expect(wren.page.getByRole('dialog').getByText(/A moderator will look at it/)).toBeVisible();

    // Withhold.
    const moss = await member(browser, baseURL, 'moss', width);
    await moss.page.goto('/review');
    await look(moss.page);
    await moss.page.getByRole('link', { name: title }).first().click();
    await moss.page.waitForURL('**/review/**');
    await look(moss.page);
    await moss.page.getByRole('radio', { name: /Withhold the revision/ }).check();
    await moss.page
      .getByRole('textbox', { name: 'Reason' })
      .fill('Too thin beside the hole: 5 mm of wood at least.');
    await moss.page.getByRole('button', { name: /Withhold the revision/ }).click();
    await expect(moss.page.getByText('Too thin beside the hole').first()).toBeVisible();
    await look(moss.page);

    // The taker sees it: in the notices, on the sheet, and at the download.
    await wren.page.goto('/notices');
    await expect(wren.page.getByText(/Too thin beside the hole/).first()).toBeVisible();
    await look(wren.page);
    await wren.page.goto(address);
    await expect(wren.page.getByText(/withheld by a moderator/).first()).toBeVisible();
    await expect(wren.page.getByRole('link', { name: 'Take package' })).toHaveCount(0);
    await look(wren.page);
    const refused = await wren.page.request.get(`/api${address}/revisions/1/package.zip`);
    expect(refused.status()).toBe(403);
    expect(((await refused.json()) as { detail: string }).detail).toContain('Too thin beside the hole');

    for (const { page, noises } of [tarn, wren, moss]) {
      expect(noises, 'console messages and page errors').toEqual([]);
      await page.context().close();
    }
  });
}
