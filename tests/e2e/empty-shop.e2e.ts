import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser } from '../support/browser.ts';
import { startHidewright, type Hidewright } from '../support/hidewright.ts';
import { openShop, settled } from '../support/steps.ts';
import { expectAccessible, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startHidewright({ mode: 'shop' });
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

/** Product.md's ten minutes: the shop's name, a hand count, leather per ft², hardware, minutes per 100, a price of one's own. */
walk('from an empty shop to a sent quote of an own piece', async ({ page }) => {
  await page.goto(hidewright.url);
  await settled(page);
  await expectAccessible(page);
  await openShop(page, 'A Small Bench');
  await expectAccessible(page);

  await page.getByRole('link', { name: /New pattern/ }).click();
  await settled(page);
  await page.getByLabel('Name', { exact: true }).fill('Key fob');
  await page.getByRole('radio', { name: /count/i }).check();
  await page.getByLabel('Pieces', { exact: true }).fill('21');
  await page.getByLabel('from a panel of').fill('279.4');
  await page.getByLabel('by', { exact: true }).fill('330.2');
  await page.getByRole('button', { name: 'Another leather' }).click();
  const leather = page.getByRole('dialog');
  await leather.getByLabel('Name').fill('Oak tan');
  await leather.getByLabel(/Price/).fill('10');
  await leather.getByRole('button', { name: 'Add the leather' }).click();
  await page.getByRole('textbox', { name: /Minutes per 100/ }).fill('150');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Keep the pattern' }).click();
  await page.waitForURL(/\/pattern-room\/patterns\/\d+$/);
  await settled(page);
  await expectAccessible(page);

  await visit(page, `${hidewright.url}/counter/quotes/new`);
  await page.getByRole('button', { name: 'New customer' }).click();
  const customer = page.getByRole('dialog');
  await customer.getByLabel('Name', { exact: true }).fill('The first customer');
  await customer.getByRole('button', { name: /Add/ }).click();
  await expect
    .poll(() => page.getByLabel('Customer', { exact: true }).inputValue(), { timeout: 30_000 })
    .not.toBe('');
  await page.getByLabel('Pattern', { exact: true }).selectOption({ label: 'Key fob' });
  await page.getByLabel('Pieces').first().fill('20');
  await page.getByLabel('Your price').first().fill('4');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page.waitForURL(/\/counter\/quotes\/\d+$/);
  await settled(page);
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Send quote' }).click();
  await page.getByRole('button', { name: 'Send by hand' }).click();
  await page.getByText('/c/').first().waitFor();
  await page.keyboard.press('Escape');
  await page.getByText('sent', { exact: true }).first().waitFor();
});
