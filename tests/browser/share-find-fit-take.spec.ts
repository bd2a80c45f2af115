import { readFileSync } from 'node:fs';
import { unzipSync } from 'fflate';
import { expect, expectAccessible, expectNoSidewaysScroll, signIn, signOut, test } from './demo.ts';

/** A clamp block, 96 × 48 mm, drawn for this test. */
const clampBlock = `<svg xmlns="http://www.w3.org/2000/svg" width="96mm" height="48mm" viewBox="0 0 96 48">
  <g id="outside"><path d="M6 0H90A6 6 0 0 1 96 6V42A6 6 0 0 1 90 48H6A6 6 0 0 1 0 42V6A6 6 0 0 1 6 0Z" fill="none" stroke="#000"/></g>
  <g id="holes"><circle cx="24" cy="24" r="4.25" fill="none" stroke="#000"/><circle cx="72" cy="24" r="4.25" fill="none" stroke="#000"/></g>
</svg>`;

for (const { name, viewport } of [
  { name: 'at a desk', viewport: { width: 1440, height: 900 } },
  { name: 'on a phone', viewport: { width: 360, height: 740 } },
]) {
  test(`a member shares, another finds it, sees that it fits, and takes it (${name})`, async ({
    quietPage: page,
  }) => {
    await page.setViewportSize(viewport);
    const title = `Clamp block ${viewport.width}`;
    const look = async () => {
      await expectAccessible(page);
      await expectNoSidewaysScroll(page);
    };

    await page.goto('/sign-in');
    await look();
    await signIn(page, 'tarn');
    await page.goto('/share');
    await look();
    await page
      .locator('input[type=file]')
      .setInputFiles({ name: 'clamp-block.svg', mimeType: 'image/svg+xml', buffer: Buffer.from(clampBlock) });
    await expect(page.getByText('96.0 × 48.0 mm').first()).toBeVisible();
    await page.getByLabel('Title').fill(title);
    await page.getByLabel('Kind').selectOption('hold-downs');
    await page.getByRole('radio', { name: /CC BY-SA 4\.0/ }).check();

    // The draft is still there after a reload.
    await page.reload();
    await expect(page.getByLabel('Title')).toHaveValue(title);
    await expect(page.getByText('96.0 × 48.0 mm').first()).toBeVisible();

    await page.getByRole('radio', { name: /Yes, with these settings/ }).check();
    await page.getByLabel('Machine', { exact: true }).selectOption({ index: 1 });
    await page.getByLabel('Material', { exact: true }).selectOption('plywood');
    await page.getByLabel('Measured thickness').fill('11.8');
    await page.getByLabel('Hold-down').selectOption('top-clamps');
    const bit = page.getByLabel('Bit', { exact: true });
    const bitName = (await bit.locator('option').allTextContents()).find((text) => text.includes('1/4 in'));
    await bit.selectOption({ label: bitName ?? '' });
    await page.getByLabel('Spindle speed').fill('16000');
    await page.getByLabel('Feed', { exact: true }).fill('-5');
    await page.getByLabel('Plunge rate').fill('500');
    await page.getByLabel('Depth of cut').fill('2');
    await page.getByLabel('Stepover').fill('2.5');
    await page.getByLabel('Run time').fill('14');
    await page.getByRole('radio', { name: /^Clean/ }).check();
    await page.getByRole('button', { name: 'Publish in the loft' }).click();
    await expect(page.getByText(/feed must not be below zero/).first()).toBeVisible();
    await look();
    await page.getByLabel('Feed', { exact: true }).fill('1500');
    await page.getByRole('button', { name: 'Publish in the loft' }).click();
    await page.waitForURL(/\/designs\/clamp-block/);
    await signOut(page);

    await signIn(page, 'wren');
    await expect(page.getByRole('heading', { level: 1 })).toContainText('designs');
    await look();
    const search = page.getByRole('searchbox');
    await search.fill(title);
    await search.press('Enter');
    const card = page.getByRole('link', { name: title, exact: true });
    await expect(card).toHaveCount(1);
    await look();
    await card.click();
    await page.waitForURL(/\/designs\/clamp-block/);
    await expect(page.getByText(/Fits your bed as drawn/).first()).toBeVisible();
    await look();

    const download = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Take package' }).first().click();
    const file = await (await download).path();
    const files = unzipSync(new Uint8Array(readFileSync(file)));
    expect(Object.keys(files)).toEqual([
      'drawing.svg',
      'original.svg',
      'settings.json',
      'LICENCE-AND-CREDITS.txt',
    ]);
    expect(Buffer.from(files['original.svg'] ?? []).toString()).toBe(clampBlock);
    const settings = JSON.parse(Buffer.from(files['settings.json'] ?? []).toString());
    expect(settings.record.settings.feedMmPerMin).toBe(1500);
    await signOut(page);
  });
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`every page is free of axe findings in ${colorScheme === 'light' ? 'light' : 'lamplight'}`, async ({
    quietPage: page,
  }) => {
    await page.emulateMedia({ colorScheme });
    await signIn(page, 'ada');
    for (const width of [1440, 360]) {
      await page.setViewportSize({ width, height: 900 });
      for (const path of [
        '/',
        '/?fits=true',
        '/?q=nothing-like-this',
        '/designs/shank-drawer-eighteen-bits',
        '/share',
        '/bench',
        '/welcome',
        '/members',
        '/account',
        '/no-such-page',
      ]) {
        await page.goto(path);
        await expectAccessible(page);
        await expectNoSidewaysScroll(page);
        expect(await page.title()).toMatch(/ · Tallyloft$/);
      }
    }
  });
}
