import { afterAll, beforeAll, expect } from 'vitest';
import { browser, closeBrowser, phone, still, watch } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { settled, signInAs } from '../support/steps.ts';
import { expectAccessible, idIn, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

walk('a quote with terms and an option, from its workings to the order', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/counter/quotes/new`);
  await page.getByLabel('Customer', { exact: true }).selectOption({ label: 'The Copper Heron' });
  await page
    .getByLabel('Pattern', { exact: true })
    .selectOption({ label: 'Luggage tag with neck' });
  await page.getByRole('checkbox', { name: 'With a brass ring' }).check();
  await page.getByText('Prices and terms').click();
  await page.getByLabel('Prices are worked out').selectOption('a markup on the cost');
  await page.getByLabel('Markup').fill('60');
  await page.getByLabel('Setting up').fill('15');
  await page.getByLabel('Rush').fill('20');
  await page.getByRole('radio', { name: 'With a brass ring' }).check();
  await page.getByText(/setting up 15.00, rush/).waitFor();
  await expectAccessible(page);
  const shown = page.getByText(/^\d[\d,]* come to$/).locator('xpath=following-sibling::dd[1]');
  const preview = await shown.textContent();
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page.waitForURL(/counter\/quotes\/\d+$/);
  await settled(page);
  const id = idIn(page.url());

  await page.getByRole('radio', { name: 'With a brass ring' }).check();
  expect(
    await page
      .getByText(/come to$/)
      .locator('xpath=following-sibling::dd[1]')
      .textContent(),
  ).toBe(preview);
  await page.getByRole('link', { name: /^All workings/ }).click();
  await page.getByRole('heading', { name: 'What an hour earns' }).waitFor();
  await settled(page);
  await expectAccessible(page);
  const was = await page
    .getByText('price each at')
    .locator('xpath=following-sibling::dd[2]')
    .textContent();
  expect(was).toContain('you ask');
  await page.getByLabel('Price each').fill('0.5');
  await page
    .getByText(/as it stands/)
    .first()
    .waitFor();
  await page.getByLabel('Price each').fill('four');
  await page.getByText('Write each as a plain number').waitFor();
  await page.setViewportSize(phone);
  await expectAccessible(page);

  const read = await page.request.get(`${hidewright.url}/api/quotes/${id}`);
  const { version } = (await read.json()) as { version: number };
  const sent = await page.request.post(`${hidewright.url}/api/quotes/${id}/sendings`, {
    data: { by: 'hand' },
    headers: { 'If-Match': `"${version}"`, origin: hidewright.url },
  });
  const { linkUrl } = (await sent.json()) as { linkUrl: string };
  await agreeAsCustomer(linkUrl);

  await visit(page, `${hidewright.url}/counter/quotes/${id}`);
  await page.getByText('With a brass ring').first().waitFor();
  await page.getByText('100 agreed by the link').waitFor();
});

/** The customer, on a phone: chooses the option and the quantity, sees what is charged once, agrees. */
async function agreeAsCustomer(linkUrl: string): Promise<void> {
  const context = await (await browser()).newContext({ ...still, viewport: phone });
  const page = await context.newPage();
  const heard = watch(page);
  await page.goto(linkUrl);
  await settled(page);
  await page.getByRole('radio', { name: 'With a brass ring' }).check();
  await page.getByRole('radio', { name: /^100/ }).check();
  await page.getByText('Setting up').waitFor();
  await page.getByText('Rush').waitFor();
  await expectAccessible(page);
  await page.getByRole('button', { name: /^Agree to 100/ }).click();
  await page.getByRole('heading', { name: 'You agreed to 100' }).waitFor();
  await page.getByText('With a brass ring').waitFor();
  await expectAccessible(page);
  expect(heard).toEqual([]);
  await context.close();
}
