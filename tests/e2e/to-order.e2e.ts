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

const buckles = 'Buckles 20 mm, solid brass';

walk('the maker reads on a phone what is to be ordered, without prices', async ({ page }) => {
  await page.setViewportSize(phone);
  await signInAs(page, hidewright.url, 'maker');
  await visit(page, `${hidewright.url}/stockroom/to-order`);
  const card = page.getByRole('region', { name: buckles, exact: true });
  await card.getByText(/70 free, below the minimum of 100\. Order \d+/).waitFor();
  await card.getByText('The coming weeks, and how it is worked out').click();
  await card.getByRole('img', { name: /70 free today/ }).waitFor();
  await card.getByText('Expected:').click();
  await card.getByText(/Its use is (steady|rare)/).waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  expect(await page.getByText(/USD/).count()).toBe(0);
  expect(await page.getByRole('button', { name: /draft/i }).count()).toBe(0);

  const places = page.getByRole('navigation', { name: 'Stockroom' });
  await places.getByText('Stockroom: To order').click();
  await expectAccessible(page);
  await expectNoOverflow(page);
  await places.getByRole('link', { name: 'On hand' }).click();
  await page.getByRole('heading', { level: 1, name: 'On hand' }).waitFor();
  await places.getByText('Stockroom: On hand').waitFor();
  expect(await places.getByRole('link').count(), 'folded up again').toBe(0);
});

walk('the owner sees why, changes a quantity, drafts it and sends the order', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await page.getByRole('link', { name: 'What to order' }).click();
  await page.getByRole('heading', { name: 'To order', exact: true }).waitFor();
  await settled(page);
  await expectAccessible(page);
  const card = page.getByRole('region', { name: buckles, exact: true });
  const field = card.getByLabel(`Order of ${buckles}`);
  await field.fill('none');
  await card.getByRole('button', { name: /^Put on the draft/ }).click();
  await card.getByText('Enter a quantity above 0.').waitFor();
  await expectAccessible(page);
  await field.fill('150');
  await card.getByRole('button', { name: /^Put on the draft/ }).click();
  await page.getByText('On the draft, not sent yet:').waitFor();
  await card.getByText('What is on draft').waitFor();
  await card.getByText(', not sent yet.').waitFor();
  await expectAccessible(page);

  await card.getByRole('link', { name: /^P-\d{4}$/ }).click();
  await page.getByRole('heading', { level: 1 }).waitFor();
  await settled(page);
  await page.getByText('150').first().waitFor();
  await page.getByRole('button', { name: 'Send', exact: true }).click();
  const dialog = page.getByRole('dialog', { name: /^Send P-/ });
  await dialog.getByRole('button', { name: 'Send it' }).click();
  await dialog.waitFor({ state: 'detached' });
  await visit(page, `${hidewright.url}/stockroom/to-order`);
  expect(await page.getByRole('region', { name: buckles, exact: true }).count()).toBe(0);
});

walk('the owner sets by hand when a thing is ordered, and lets it go again', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/stockroom/to-order?show=all`);
  const snaps = 'Snaps, line 20, brass';
  const card = page.getByRole('region', { name: snaps, exact: true });
  await card.getByText('The coming weeks, and how it is worked out').click();
  await card.getByRole('button', { name: /^Set by hand/ }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel(/^Order below/).fill('3000');
  await dialog.getByLabel(/^So many at a time/).fill('950');
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'Save' }).click();
  await card.getByText(/below the 3,000 set by hand\. Order 1,000, as set by hand\./).waitFor();
  await card.getByText('The coming weeks, and how it is worked out').click();
  await card.getByText('Set by hand: order below 3,000, 950 at a time.').waitFor();
  await card.getByRole('button', { name: /^Let it go/ }).click();
  await card.getByText(/free: enough\. It is ordered below 300\./).waitFor();
});

walk('the shop’s own figures stand in the Office', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/office`);
  await page.getByText('When and how much to order').click();
  await page.getByLabel('Stock should last until a delivery').fill('30');
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByText('Enter a share from 50 to below 100 %.').first().waitFor();
  await page.getByLabel('Stock should last until a delivery').fill('98');
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByText('Saved. New quotes begin with these values.').first().waitFor();
  await expectAccessible(page);
});

walk('a bookkeeper who types its address is told in the shell whose it is', async ({ page }) => {
  await signInAs(page, hidewright.url, 'bookkeeper');
  await visit(page, `${hidewright.url}/stockroom/to-order`);
  await page.getByText('Only the owner or the maker can see this.').waitFor();
  await page.getByRole('navigation', { name: 'Rooms' }).waitFor();
});
