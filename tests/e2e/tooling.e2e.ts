import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { settled, signInAs } from '../support/steps.ts';
import { expectAccessible, expectNoOverflow, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

interface Named {
  items: { id: number; name: string }[];
}

walk('which metal for a run and its repeats, and whether the plate lasts', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/pattern-room/tooling`);
  await page.getByRole('button', { name: 'Change brass' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel(/^Price of one plate/).fill('-3');
  await dialog.getByRole('button', { name: 'Save' }).click();
  await dialog
    .getByText(/^Enter what one new plate costs/)
    .first()
    .waitFor();
  await expectAccessible(page);
  await dialog.getByLabel(/^Price of one plate/).fill('322');
  await dialog.getByRole('button', { name: 'Save' }).click();
  await page.getByText('The price of brass plates is saved.').first().waitFor();

  const read = await page.request.get(`${hidewright.url}/api/patterns?limit=200`);
  const patterns = ((await read.json()) as Named).items;
  const coaster = patterns.find(({ name }) => name === 'Drinks coaster, round');
  await visit(page, `${hidewright.url}/pattern-room/patterns/${coaster?.id}`);
  await page.getByRole('link', { name: 'Does it last?' }).click();
  await page.getByLabel(/^Customer/).selectOption({ label: 'The Copper Heron' });
  await page.getByLabel('Pieces to cut').fill('2000');
  await page.getByLabel('Repeats expected').fill('40');
  await page.getByRole('button', { name: 'Look' }).click();
  await page
    .getByText(/so it need not be charged again/)
    .first()
    .waitFor();
  await page.getByText(/Brass pays from [\d,]+ impressions on/).waitFor();
  await page.getByText(/fine detail, heat and storage decide more often/).waitFor();
  await page.getByText('least over the repeats').first().waitFor();
  await expectAccessible(page);
  await page.setViewportSize(phone);
  await settled(page);
  await expectAccessible(page);
  await expectNoOverflow(page);
});

walk('a customer’s own plate is kept for its term, and given back', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await page.getByRole('link', { name: /own stamp plate 30$/ }).click();
  await page.getByText('Its term is over.').waitFor();
  await expectAccessible(page);
  const states = page.getByLabel('State', { exact: true }).locator('option');
  expect(await states.allInnerTexts()).toEqual(['on the rack']);
  await page.getByRole('button', { name: 'Give it back' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Give it back' }).click();
  await page.getByText('Stamp plate 30 is given back.').first().waitFor();
  await expect.poll(() => page.getByRole('button', { name: 'Scrap it' }).count()).toBe(0);
  await visit(page, `${hidewright.url}/today`);
  expect(await page.getByRole('link', { name: /own stamp plate 30$/ }).count()).toBe(0);

  await visit(page, `${hidewright.url}/pattern-room/tooling/new`);
  await page.getByRole('radio', { name: /The customer’s own/ }).check();
  await page.getByLabel('Name', { exact: true }).fill('Their own die');
  await page.getByLabel(/^Cost/).fill('0');
  await page.getByLabel(/^Expected life/).fill('0');
  await page.getByRole('button', { name: 'Add the tool' }).click();
  await page
    .getByText(/^Enter how many cuts or impressions it lasts/)
    .first()
    .waitFor();
  await page.getByLabel(/^Expected life/).fill('5000');
  await page.getByLabel(/^Customer/).selectOption({ label: 'The Copper Heron' });
  await page.getByLabel(/^Kept until/).fill('2099-01-31');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Add the tool' }).click();
  await page.waitForURL('**/pattern-room/tooling');
  await page.getByText('the customer’s own, kept until Sat 31 Jan 2099').first().waitFor();
});
