import { afterAll, beforeAll } from 'vitest';
import { closeBrowser } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { settled } from '../support/steps.ts';
import { expectAccessible, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

walk('the owner signs in and lands on Today', async ({ page }) => {
  await visit(page, hidewright.url);
  await page.getByLabel(/e-mail/i).fill('owner@example.com');
  await page.getByLabel(/password/i).fill('marlpit-by-the-fen');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL('**/today');
  await settled(page);
  await expectAccessible(page);
});
