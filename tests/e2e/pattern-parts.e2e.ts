import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone, wide } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
import { startHidewright, type Hidewright } from '../support/hidewright.ts';
import { openShop, settled } from '../support/steps.ts';
import { expectAccessible, expectNoOverflow, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startHidewright({ mode: 'shop' });
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

walk('what the numbers of a run rest on is saved and opened again', async ({ page }) => {
  await page.goto(hidewright.url);
  await settled(page);
  await openShop(page, 'A Thorough Bench');
  await describePattern(page, await addWrap(page));
  await describeShop(page);
  await describeLeather(page);
});

const step = { setupMinutes: '6', per: 'piece', secondsPerUnit: '9', rejectPercent: '2' };

/** A pattern with snaps, and rings beside them; gives its address. */
async function addWrap(page: Page): Promise<string> {
  const leatherId = await add(page, 'leathers', { name: 'Oak tan', pricePerFt2: '10' });
  const snap = { name: 'Snap', kind: 'hardware', unitPrice: '0.24' };
  const hardwareId = await add(page, 'hardware', snap);
  await add(page, 'hardware', { ...snap, name: 'Ring', unitPrice: '1' });
  const thread = { name: 'Thread', kind: 'supplies', unit: 'm', unitPrice: '0.03' };
  await add(page, 'hardware', thread);
  const definition = {
    layoutBy: 'hand count',
    outline: null,
    handCount: { pieces: 21, widthMm: '279.4', heightMm: '330.2' },
    container: null,
    turns: 'quarter turns',
    spacingMm: '2',
    trimMm: '3',
    leatherId,
    hardware: [{ hardwareId, perPiece: 1 }],
    work: {
      kind: 'steps',
      steps: [
        { ...step, name: 'Case' },
        { ...step, name: 'Stamp' },
      ],
    },
    needsDie: true,
    needsPlate: true,
  };
  const id = await add(page, 'patterns', { name: 'Cord wrap', definition });
  return `${hidewright.url}/pattern-room/patterns/${id}`;
}

async function add(page: Page, what: string, data: object): Promise<number> {
  const reply = await page.request.post(`${hidewright.url}/api/${what}`, { data });
  expect(reply.status(), await reply.text()).toBe(201);
  return ((await reply.json()) as { id: number }).id;
}

async function describePattern(page: Page, address: string): Promise<void> {
  await visit(page, `${address}/change`);
  await keyboardAlone.press(page.getByRole('button', { name: 'Hardware from the list' }));
  const thread = page.getByLabel('Hardware', { exact: true }).nth(1);
  await keyboardAlone.choose(thread, 'Thread, 0.03 per m');
  await page.getByLabel('How many', { exact: true }).nth(1).fill('30');
  await keyboardAlone.choose(page.getByLabel('Counted', { exact: true }).nth(1), 'for 100 pieces');
  await open(page, 'Dye, thread, glue');
  await keyboardAlone.press(page.getByRole('button', { name: 'Another supply' }));
  await page.getByLabel('Supply 1', { exact: true }).fill('Beeswax');
  await page.getByLabel('Cost', { exact: true }).fill('1.2');
  await open(page, 'Options for the customer');
  await keyboardAlone.press(page.getByRole('button', { name: 'Another option' }));
  await page.getByLabel('Option 1', { exact: true }).fill('With a ring');
  await keyboardAlone.press(page.getByRole('button', { name: 'Keep the change' }));

  // What is wrong is said, the way leads there, and what is right stays.
  await keyboardAlone.press(page.getByRole('link', { name: /Say what is left out/ }));
  await keyboardAlone.choose(page.getByLabel('In place of'), 'Snap');
  await keyboardAlone.choose(page.getByLabel('comes'), 'Ring');
  const steps = page.getByRole('listitem');
  const first = steps.filter({ has: page.getByLabel('Step 1', { exact: true }) });
  await keyboardAlone.press(first.locator('summary'));
  await keyboardAlone.fill(first.getByLabel(/^Lies at most/), '30');
  await expectSoundAtBothWidths(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Keep the change' }));

  await page.waitForURL(address);
  await page.getByText('Beeswax, 1.20 for 100 pieces').waitFor();
  await page.getByText('30 m of Thread, for 100 pieces').waitFor();
  await page.getByText('With a ring: 1 × Ring in place of Snap').waitFor();
  await page.getByText('lies at most 30 min').waitFor();
  await open(page, 'One at a time or in batches?');
  await page.getByLabel('Run of').fill('300');
  const byStep = page.getByRole('row', { name: /^step by step/ });
  await byStep.getByText('would lie longer than 30 min after Case').waitFor();
  await expectSoundAtBothWidths(page);

  await visit(page, `${address}/change`);
  await open(page, 'Options for the customer');
  expect(await page.getByLabel('Option 1', { exact: true }).inputValue()).toBe('With a ring');
  const comes = page.getByLabel('comes').locator('option:checked');
  await expect.poll(() => comes.innerText()).toBe('Ring');
}

/** How prices come about; a mistake behind a summary opens it. */
async function describeShop(page: Page): Promise<void> {
  await visit(page, `${hidewright.url}/office`);
  await open(page, 'Prices, charges and fees');
  const rule = page.getByLabel('A price that nobody typed should');
  await rule.selectOption({ label: 'a margin of the price' });
  await open(page, 'Prices, charges and fees');
  await keyboardAlone.press(page.getByRole('button', { name: 'Save' }));
  await keyboardAlone.press(page.getByRole('link', { name: /^Enter a margin/ }));
  await page.keyboard.type('40');
  await open(page, 'Minimum wage, rest and overhead');
  await expectSoundAtBothWidths(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Save' }));
  await page.getByText('Saved.').first().waitFor();
  const read = await page.request.get(`${hidewright.url}/api/workshop`);
  const kept: unknown = await read.json();
  expect(kept).toMatchObject({ priceRule: { kind: 'margin', percent: '40' } });
}

async function describeLeather(page: Page): Promise<void> {
  await visit(page, `${hidewright.url}/stockroom/leather/new`);
  await page.getByLabel('Name', { exact: true }).fill('Harness side');
  await page.getByLabel('Price', { exact: true }).fill('11');
  await open(page, 'Bought whole');
  await page.getByLabel(/^Form/).selectOption('side');
  await page.getByLabel(/^Area of a usual one/).fill('22');
  await expectSoundAtBothWidths(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Add the leather' }));
  await page.waitForURL(/\/stockroom\/leather\/\d+$/);
  await page.getByText('Bought whole: as a side').waitFor();
}

const open = (page: Page, word: string) =>
  keyboardAlone.press(page.locator('summary').filter({ hasText: word }).first());

/** Nothing stands out of the page at either width, and axe finds nothing. */
async function expectSoundAtBothWidths(page: Page): Promise<void> {
  for (const viewport of [phone, wide]) {
    await page.setViewportSize(viewport);
    await expectNoOverflow(page);
    await expectAccessible(page);
  }
}
