import { afterAll, beforeAll, expect, it } from 'vitest';
import { browser, closeBrowser, still, wide } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { settled, signInAs } from '../support/steps.ts';
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

/** A page of its own, since what the browser says of a missing file is what is wanted here. */
it('a page from before an upgrade is loaded anew, and then goes on', async () => {
  const context = await (await browser()).newContext({ ...still, viewport: wide });
  const page = await context.newPage();
  await signInAs(page, hidewright.url, 'owner');
  const gone = await page.request.get(`${hidewright.url}/assets/gone-before.js`);
  expect(gone.status()).toBe(404);
  let asked = 0;
  await page.route('**/assets/log-*.js', (route) => {
    asked += 1;
    return asked === 1 ? route.fulfill({ status: 404, body: '' }) : route.continue();
  });
  await page.goto(`${hidewright.url}/office`);
  await settled(page);
  const log = page.getByRole('link', { name: 'Who did what' });
  const loadedAnew = page.waitForEvent('load');
  await log.click();
  await loadedAnew;
  await settled(page);
  await log.click();
  await page.waitForURL('**/office/log');
  await page.getByRole('heading', { level: 1, name: 'Who did what' }).waitFor();
  expect(asked).toBeGreaterThan(1);
  await context.close();
});
