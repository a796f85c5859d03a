import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { signInAs } from '../support/steps.ts';
import { expectAccessible, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
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

walk(
  'a week’s mix says what one more hour is worth and what stays for large pieces',
  async ({ page }) => {
    await signInAs(page, hidewright.url, 'owner');
    await visit(page, `${hidewright.url}/bench`);
    await page.getByRole('link', { name: 'A week’s mix' }).click();
    await page.getByText(/^begins with \d+ finished runs/).waitFor();
    await expectAccessible(page);
    await keyboardAlone.press(page.getByRole('button', { name: 'Work it out' }));
    await page.getByText(/^One more bench hour would leave/).waitFor();
    await expectAccessible(page);

    await page.getByRole('button', { name: 'A large piece' }).click();
    const piece = page.getByRole('group', { name: 'The work' }).getByRole('listitem').last();
    await piece.getByRole('textbox', { name: /^Work/ }).fill('Weekend bag');
    await piece.getByLabel(/^Left/).fill('480');
    await piece.getByLabel('Bench, min').fill('900');
    await page.getByLabel('Income the shop needs a week').fill('100');
    await page.getByRole('button', { name: 'Work it out' }).click();
    await page.getByText(/Up to .* h of the week can go to large pieces/).waitFor();
    await page.getByRole('row', { name: /Weekend bag/ }).waitFor();
    await page.setViewportSize(phone);
    await expectAccessible(page);
    // Another tab has none of this one's drafts.
    await page.evaluate(() => sessionStorage.clear());
    await page.reload();
    await page.getByText(/^as you worked it out last; kept for you on this device/).waitFor();
    await expect
      .poll(() => piece.getByRole('textbox', { name: /^Work/ }).inputValue())
      .toBe('Weekend bag');

    await piece.getByLabel('Promised').fill('30');
    await page.getByRole('button', { name: 'Work it out' }).click();
    await page
      .getByText(/Promise less, first of all Weekend bag/)
      .first()
      .waitFor();
    await expectAccessible(page);
  },
);
