import { readFileSync } from 'node:fs';
import type { Page } from '@playwright/test';
import { unzipSync } from 'fflate';
import { expect } from './demo.ts';

/** A clamp block with two holes, in mm, drawn for these tests. */
export const clampBlock = (lengthMm: number) => {
  const end = lengthMm - 6;
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${lengthMm}mm" height="48mm" viewBox="0 0 ${lengthMm} 48">
  <g id="outside"><path d="M6 0H${end}A6 6 0 0 1 ${lengthMm} 6V42A6 6 0 0 1 ${end} 48H6A6 6 0 0 1 0 42V6A6 6 0 0 1 6 0Z" fill="none" stroke="#000"/></g>
  <g id="holes"><circle cx="24" cy="24" r="4.25" fill="none" stroke="#000"/><circle cx="72" cy="24" r="4.25" fill="none" stroke="#000"/></g>
</svg>`;
};

export async function giveDrawing(page: Page, svg: string, sizeShown: string): Promise<void> {
  await page.locator('input[type=file]').setInputFiles({
    name: 'clamp-block.svg',
    mimeType: 'image/svg+xml',
    buffer: Buffer.from(svg),
  });
  await expect(page.getByText(sizeShown).first()).toBeVisible();
}

/** The settings that worked, all but the feed. */
export async function tellSettings(page: Page): Promise<void> {
  await page.getByRole('radio', { name: /Yes, with these settings/ }).check();
  await page.getByLabel('Machine', { exact: true }).selectOption({ index: 1 });
  await page.getByLabel('Material', { exact: true }).selectOption('plywood');
  await page.getByLabel('Measured thickness').fill('11.8');
  await page.getByLabel('Hold-down').selectOption('top-clamps');
  const bit = page.getByLabel('Bit', { exact: true });
  const names = await bit.locator('option').allTextContents();
  await bit.selectOption({ label: names.find((text) => text.includes('1/4 in')) ?? '' });
  await page.getByLabel('Spindle speed').fill('16000');
  await page.getByLabel('Plunge rate').fill('500');
  await page.getByLabel('Depth of cut').fill('2');
  await page.getByLabel('Stepover').fill('2.5');
  await page.getByLabel('Run time').fill('14');
  await page.getByRole('radio', { name: /^Clean/ }).check();
}

/** Takes the package and answers with its files. */
export async function takePackage(page: Page): Promise<Record<string, Uint8Array>> {
  const download = page.waitForEvent('download');
  await page.getByRole('link', { name: 'Take package' }).first().click();
  return unzipSync(new Uint8Array(readFileSync(await (await download).path())));
}
