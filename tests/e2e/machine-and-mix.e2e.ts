import { afterAll, beforeAll } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
import { startHidewright, type Hidewright } from '../support/hidewright.ts';
import { signInAs } from '../support/steps.ts';
import { expectAccessible, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startHidewright();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

walk('whether a press pays is answered while it is typed', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/pattern-room/presses`);
  await page.getByRole('link', { name: 'Does the machine pay?' }).click();
  await page.getByText(/^Type what it costs/).waitFor();
  await expectAccessible(page);
  await keyboardAlone.fill(page.getByLabel('It costs'), '600');
  await keyboardAlone.fill(page.getByLabel('It saves on a run'), '50');
  await keyboardAlone.fill(page.getByLabel('Runs a month'), '5');
  await keyboardAlone.fill(page.getByLabel('An hour is worth'), '24');
  await page.getByRole('heading', { name: 'It pays' }).waitFor();
  await page.getByText(/It saves 4 h 10 min a month, worth 100.00/).waitFor();
  await page.setViewportSize(phone);
  await expectAccessible(page);
  await page.reload();
  await page.getByRole('heading', { name: 'It pays' }).waitFor();

  await page.getByLabel('Runs a month').fill('0.1');
  await page.getByRole('heading', { name: 'It does not pay' }).waitFor();
  await page.getByText(/does not come back within 5 years/).waitFor();
  await page.getByLabel('In use for').fill('2.5');
  await page.getByLabel('Interest a year').focus();
  await page
    .locator('form')
    .getByText(/Enter how many whole years/)
    .waitFor();
  await expectAccessible(page);
});
