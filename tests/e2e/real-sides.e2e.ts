import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { photoOfSide, photoRule } from '../support/picture.ts';
import { startDemo } from '../support/made-demo.ts';
import { signInAs } from '../support/steps.ts';
import { expectAccessible, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  expect(await hidewright.stop()).toBe(0);
});

/** A side of that leather which is drawn, without flaws. */
async function drawnSideOf(page: Page, leather: RegExp): Promise<number> {
  const { request } = page;
  const read = await request.get(`${hidewright.url}/api/lots?onRack=yes&limit=200`);
  const side = ((await read.json()) as Named).items
    .filter(({ form, leatherName }) => form === 'side' && leather.test(leatherName))
    .at(-1);
  const drawing = `${hidewright.url}/api/lots/${side?.id}/drawing`;
  const { version } = (await (await request.get(drawing)).json()) as { version: number };
  const outline = [
    { x: 0, y: 0 },
    { x: 1900, y: 0 },
    { x: 1800, y: 950 },
    { x: 100, y: 1000 },
  ];
  const drawn = await request.put(drawing, {
    headers: { 'If-Match': `"${version}"` },
    data: { outline, flaws: [], usablePercent: '85' },
  });
  expect(drawn.status()).toBe(200);
  return Number(side?.id);
}

interface Named {
  items: { id: number; tag: string; name: string; form: string; leatherName: string }[];
}

walk('a side is drawn with its flaws by keyboard and finger, and laid out', async ({ page }) => {
  await signInAs(page, hidewright.url, 'maker');
  const read = await page.request.get(`${hidewright.url}/api/lots?onRack=yes&limit=200`);
  const lots = ((await read.json()) as Named).items;
  const side = lots.find(({ form, leatherName }) => form === 'side' && /russet/.test(leatherName));
  await page.setViewportSize(phone);
  await visit(page, `${hidewright.url}/stockroom/lots/${side?.id}`);
  await keyboardAlone.press(page.getByRole('button', { name: 'Draw it' }));
  await expectAccessible(page);

  const canvas = page.getByRole('application');
  await canvas.focus();
  for (const key of ['Enter', 'Shift+ArrowRight', 'Enter', 'Shift+ArrowDown', 'Enter', 'Space']) {
    await page.keyboard.press(key);
  }
  await expect.poll(() => page.getByText(/^Flaw 1, 50 × 50 mm/).count()).toBe(1);
  const box = await canvas.boundingBox();
  if (!box) throw new Error('The side is not to be seen.');
  await page.mouse.move(box.x + box.width * 0.3, box.y + box.height * 0.3);
  await page.mouse.down();
  await page.mouse.move(box.x + box.width * 0.4, box.y + box.height * 0.3, { steps: 5 });
  await page.mouse.move(box.x + box.width * 0.35, box.y + box.height * 0.45, { steps: 5 });
  await page.mouse.up();
  await page.getByText(/^Flaw 2/).waitFor();
  await keyboardAlone.press(page.getByRole('button', { name: 'Edge' }));
  await page.getByRole('button', { name: /^Corner 1:/ }).focus();
  await page.keyboard.press('ArrowRight');
  await expectAccessible(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Save the drawing' }));

  await page.getByRole('heading', { name: 'What it gives' }).waitFor();
  await keyboardAlone.choose(page.getByLabel('Pattern', { exact: true }), 'Luggage tag with neck');
  await keyboardAlone.press(page.getByRole('button', { name: 'Lay it out' }));
  await page.getByText(/no layout gives more than/).waitFor({ timeout: 120_000 });
  await page.getByRole('button', { name: 'Larger' }).click();
  await expectAccessible(page);

  await keyboardAlone.check(page.getByRole('radio', { name: /^In strips for the press/ }));
  await keyboardAlone.press(page.getByRole('button', { name: 'Lay it out' }));
  await page.getByText(/^Cut it (along|across) the spine/).waitFor({ timeout: 120_000 });
  expect(await page.getByText(/ wide, .* long: /).count()).toBeGreaterThan(1);
  await expectAccessible(page);
});

walk('the most pieces of a side are looked for, and the search is stopped', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  const lotId = await drawnSideOf(page, /russet/);
  await visit(page, `${hidewright.url}/stockroom/lots/${lotId}`);
  await keyboardAlone.choose(page.getByLabel('Pattern', { exact: true }), 'Luggage tag with neck');
  await keyboardAlone.check(page.getByRole('radio', { name: /As many as can be found/ }));
  await keyboardAlone.press(page.getByRole('button', { name: 'Lay it out' }));

  const bar = page.getByRole('progressbar', { name: 'Search for the most pieces' });
  await bar.waitFor({ timeout: 60_000 });
  await keyboardAlone.press(page.getByRole('button', { name: 'Stop, this will do' }));
  await page.getByText('Stopped. This is the most found so far.').waitFor();
  await page.getByText(/no layout gives more than/).waitFor();
  expect(await bar.count()).toBe(0);
  await expectAccessible(page);

  await keyboardAlone.press(page.getByRole('button', { name: 'Lay it out' }));
  const share = async () => Number(await bar.getAttribute('aria-valuenow'));
  await expect.poll(share, { timeout: 60_000 }).toBeGreaterThan(0);
  await page.getByText(/^Looking for more: \d+ so far$/).waitFor();
  await expectAccessible(page);
  await page.getByText('The most that could be found.').waitFor({ timeout: 120_000 });
});

walk('a photo lies true to scale under the drawing, and is there next time', async ({ page }) => {
  await signInAs(page, hidewright.url, 'maker');
  const lotId = await drawnSideOf(page, /russet/);
  const read = async () =>
    (await (await page.request.get(`${hidewright.url}/api/lots/${lotId}/drawing`)).json()) as {
      photo: { mmPerPixel: number; x: number } | null;
    };
  await visit(page, `${hidewright.url}/stockroom/lots/${lotId}`);
  await page.getByRole('button', { name: 'Change the drawing' }).click();
  await page.getByRole('button', { name: 'Photo', exact: true }).click();
  const file = page.getByLabel('Photo of the side');
  const drawing = { name: 'side.svg', mimeType: 'image/svg+xml', buffer: Buffer.from('<svg/>') };
  await file.setInputFiles(drawing);
  await page.getByText(/^Choose a photo as PNG, JPEG or WebP/).waitFor();
  await expectAccessible(page);

  const buffer = await photoOfSide(page);
  await file.setInputFiles({ name: 'side.png', mimeType: 'image/png', buffer });
  const photo = page.locator('svg image');
  await photo.waitFor();
  const canvas = page.getByRole('application');
  await canvas.scrollIntoViewIfNeeded();
  const box = await photo.boundingBox();
  if (!box) throw new Error('The photo is not to be seen.');
  const { from, to } = photoRule;
  await page.mouse.move(box.x + box.width * from.x, box.y + box.height * from.y);
  await page.mouse.down();
  await page.mouse.move(box.x + box.width * to.x, box.y + box.height * to.y, { steps: 5 });
  await page.mouse.up();
  await page.getByLabel('Length of the line').fill('1000 mm');
  await page.getByRole('button', { name: 'Set the scale' }).click();
  await page.getByText('The photo is true to scale.').waitFor();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Save the drawing' }).click();
  await page.getByRole('button', { name: 'Change the drawing' }).waitFor();
  const kept = (await read()).photo;
  // The rule is 200 pixels long.
  expect(kept?.mmPerPixel).toBeCloseTo(5, 1);

  // By keyboard alone: another length for a line of two ends, then the photo moved and dimmed.
  await page.reload();
  await keyboardAlone.press(page.getByRole('button', { name: 'Change the drawing' }));
  await keyboardAlone.press(page.getByRole('button', { name: 'Photo', exact: true }));
  await photo.waitFor();
  await canvas.focus();
  for (const key of ['Enter', ...Array<string>(10).fill('Shift+ArrowRight'), 'Enter'])
    await page.keyboard.press(key);
  await keyboardAlone.fill(page.getByLabel('Length of the line'), '1000 mm');
  await keyboardAlone.press(page.getByRole('button', { name: 'Set the scale' }));
  await page.getByText('The photo is true to scale.').waitFor();
  await keyboardAlone.press(page.getByRole('button', { name: 'Move', exact: true }));
  await canvas.focus();
  await page.keyboard.press('Shift+ArrowLeft');
  const strength = page.getByRole('slider', { name: 'Photo' });
  await strength.focus();
  await page.keyboard.press('Home');
  expect(await strength.getAttribute('aria-valuetext')).toBe('hidden');
  await keyboardAlone.press(page.getByRole('button', { name: 'Save the drawing' }));
  await page.getByRole('button', { name: 'Change the drawing' }).waitFor();
  const again = (await read()).photo;
  // 500 mm by the arrow keys were said to be 1000.
  expect(again?.mmPerPixel).toBeCloseTo(2 * (kept?.mmPerPixel ?? 0), 6);
});

walk('what a run is best cut from', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  const read = await page.request.get(`${hidewright.url}/api/patterns?limit=200`);
  const patterns = ((await read.json()) as Named).items;
  const coaster = patterns.find(({ name }) => name === 'Drinks coaster, round');
  await visit(page, `${hidewright.url}/pattern-room/patterns/${coaster?.id}`);
  await page.getByRole('heading', { name: 'At the press' }).waitFor();
  await page.getByRole('link', { name: 'What to cut from' }).click();
  await page.getByLabel('Good pieces needed').fill('100');
  await page.getByRole('button', { name: 'Compare' }).click();
  await page.getByText('cheapest', { exact: true }).waitFor({ timeout: 120_000 });
  expect(await page.getByRole('row', { name: /^Strip/ }).count()).toBeGreaterThan(0);
  await page.getByText(/^Take/).first().waitFor();
  await expectAccessible(page);
  await visit(page, `${hidewright.url}/pattern-room/presses`);
  await page
    .getByRole('button', { name: /^Change/ })
    .first()
    .click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel(/^Throat/).fill('280');
  await dialog.getByRole('button', { name: 'Save' }).click();
  await page.getByText('Clicker by the window is saved.').first().waitFor();
  await expectAccessible(page);
});

walk(
  'more pieces than rows give are looked for, and the search can be stopped',
  async ({ page }) => {
    await signInAs(page, hidewright.url, 'owner');
    const read = await page.request.get(`${hidewright.url}/api/patterns?limit=200`);
    const patterns = ((await read.json()) as Named).items;
    const tag = patterns.find(({ name }) => name === 'Luggage tag with neck');
    await visit(page, `${hidewright.url}/pattern-room/patterns/${tag?.id}/change`);
    await page
      .getByText(/from a panel/)
      .first()
      .waitFor({ timeout: 60_000 });
    await page.getByRole('radio', { name: /As many as can be found/ }).check();
    await expect.poll(() => page.locator('[aria-busy=true]').count(), { timeout: 60_000 }).toBe(0);
    await expectAccessible(page);
  },
);
