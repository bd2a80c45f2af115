import { expect, expectAccessible, expectNoSidewaysScroll, signIn, signOut, test } from './demo.ts';
import { clampBlock, giveDrawing, takePackage, tellSettings } from './share-steps.ts';

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
    await giveDrawing(page, clampBlock(96), '96.0 × 48.0 mm');
    await page.getByLabel('Title').fill(title);
    await page.getByLabel('Kind').selectOption('hold-downs');
    await page.getByRole('radio', { name: /CC BY-SA 4\.0/ }).check();

    // The draft is still there after a reload.
    await page.reload();
    await expect(page.getByLabel('Title')).toHaveValue(title);
    await expect(page.getByText('96.0 × 48.0 mm').first()).toBeVisible();

    await tellSettings(page);
    await page.getByLabel('Feed', { exact: true }).fill('-5');
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

    const files = await takePackage(page);
    expect(Object.keys(files)).toEqual([
      'drawing.svg',
      'original.svg',
      'settings.json',
      'LICENCE-AND-CREDITS.txt',
    ]);
    expect(Buffer.from(files['original.svg'] ?? []).toString()).toBe(clampBlock(96));
    const settings = JSON.parse(Buffer.from(files['settings.json'] ?? []).toString());
    expect(settings.record.settings.feedMmPerMin).toBe(1500);
    await signOut(page);
  });
}
