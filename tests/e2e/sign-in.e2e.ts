import { afterAll, beforeAll } from 'vitest';
import { closeBrowser } from '../support/browser.ts';
import { startHidewright, type Hidewright } from '../support/hidewright.ts';
import { expectAccessible, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startHidewright();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

walk('the owner signs in and lands on Today', async ({ page }) => {
  await page.goto(hidewright.url);
  await expectAccessible(page);
  await page.getByLabel(/e-mail/i).fill('owner@example.com');
  await page.getByLabel(/password/i).fill('marlpit-by-the-fen');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL('**/today');
  await expectAccessible(page);
});
