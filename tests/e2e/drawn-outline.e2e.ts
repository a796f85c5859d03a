import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { startHidewright, type Hidewright } from '../support/hidewright.ts';
import { openShop, settled } from '../support/steps.ts';
import { expectAccessible, expectNoOverflow, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startHidewright({ mode: 'shop' });
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

const inside =
  '<path d="M5 5 H75 L95 25 L75 45 H5 Z"/><rect x="10" y="15" width="4" height="20"/>' +
  '<circle cx="80" cy="25" r="3"/><text x="30" y="25">Room 5</text>';
const bow = '<path d="M0 0 L40 30 L40 0 L0 30 Z"/>';
const head = 'xmlns="http://www.w3.org/2000/svg" viewBox="0 0 100 50"';

async function choose(page: Page, name: string, text: string): Promise<void> {
  const file = { name, mimeType: 'image/svg+xml', buffer: Buffer.from(text) };
  await page.getByLabel('Drawing', { exact: true }).setInputFiles(file);
}

walk('an outline from a drawing: refused, mended, sized, kept, and printed', async ({ page }) => {
  await page.goto(hidewright.url);
  await settled(page);
  await openShop(page, 'A Drawing Bench');
  await page.goto(`${hidewright.url}/pattern-room/patterns/new`);
  await settled(page);
  await page.getByLabel('Name', { exact: true }).fill('Room tag');
  await page.getByRole('radio', { name: /From a drawing/ }).check();
  await page.getByLabel('Width', { exact: true }).fill('300');
  await page.getByLabel('Height', { exact: true }).fill('200');
  await expectAccessible(page);

  // What is wrong stands beside the field, and nothing typed is lost.
  await choose(page, 'script.svg', `<svg ${head}><script>1</script>${inside}</svg>`);
  await page.getByText('The drawing holds a script.').waitFor();
  await choose(page, 'bow.svg', `<svg ${head} width="100mm">${bow}</svg>`);
  await page.getByText('The outline crosses itself near x 20.0, y 15.0 mm.').waitFor();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Keep the pattern' }).click();
  await page.getByRole('link', { name: /Choose a drawing/ }).click();
  expect(await page.getByLabel('Drawing', { exact: true }).evaluate(isFocused)).toBe(true);
  expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe('Room tag');

  // No size in the file: a width is asked for, by keyboard, in the unit that is written.
  await choose(page, 'tag.svg', `<svg ${head}>${inside}</svg>`);
  await page.getByText('Lettering is left out').waitFor();
  await page.getByLabel('Width of the piece').focus();
  await page.keyboard.type('4 in');
  await page.getByText('101.6 × 45.2 mm').first().waitFor();
  await page.getByRole('checkbox', { name: '6.8 × 6.8 mm' }).focus();
  await page.keyboard.press('Space');
  await page.getByRole('img', { name: 'Layout of Room tag' }).waitFor();
  await expectAccessible(page);
  await page.setViewportSize(phone);
  await expectAccessible(page);
  await expectNoOverflow(page);

  // Another shape and back: the file is still open, and what was ticked is ticked.
  await page.getByRole('radio', { name: 'Oval' }).check();
  await page.getByRole('radio', { name: /From a drawing/ }).check();
  expect(await page.getByRole('checkbox', { name: '6.8 × 6.8 mm' }).isChecked()).toBe(true);

  await page.getByRole('button', { name: 'Another leather' }).click();
  const leather = page.getByRole('dialog');
  await leather.getByLabel('Name').fill('Oak tan');
  await leather.getByLabel(/Price/).fill('10');
  await leather.getByRole('button', { name: 'Add the leather' }).click();
  await page.getByRole('textbox', { name: /Minutes per 100/ }).fill('150');
  await page.getByRole('button', { name: 'Keep the pattern' }).click();
  await page.waitForURL(/\/pattern-room\/patterns\/\d+$/);
  await settled(page);
  await page.getByText('drawn, 101.6 × 45.16 mm, 1 hole punched').first().waitFor();
  await expectAccessible(page);
  expect((await download(page, /Template to print/)).subarray(0, 5).toString()).toBe('%PDF-');
  expect((await download(page, /Template for artwork/)).toString()).toContain('>Room tag<');

  // Changed again, it still has its outline without the file.
  await page.getByRole('link', { name: 'Change', exact: true }).click();
  await settled(page);
  await page.getByText('The outline kept so far').waitFor();
  await page.getByLabel('Name', { exact: true }).fill('Room tag, oak');
  await page.getByRole('button', { name: 'Keep the change' }).click();
  await page.getByRole('heading', { name: 'Room tag, oak' }).waitFor();
  await page.getByText('drawn, 101.6 × 45.16 mm, 1 hole punched; version 1').waitFor();
});

const isFocused = (element: Element) => element === document.activeElement;

async function download(page: Page, name: RegExp): Promise<Buffer> {
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name }).click(),
  ]);
  return readFile(await file.path());
}
