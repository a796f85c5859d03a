import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { signInAs } from '../support/steps.ts';
import { expectAccessible, expectNoOverflow, visit, walk } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

interface OrderRow {
  id: number;
  number: string;
  state: string;
  promisedOn: string;
  customerName: string;
  job: { id: number; number: string };
}

async function ordersIn(page: Page, ...states: string[]): Promise<OrderRow[]> {
  const read = await page.request.get(`${hidewright.url}/api/orders?limit=200`);
  const { items } = (await read.json()) as { items: OrderRow[] };
  return items.filter(({ state }) => states.includes(state));
}

const laterDay = (day: string, days: number) =>
  new Date(Date.parse(day) + days * 86_400_000).toISOString().slice(0, 10);

walk('the owner promises another day, and the bench says whether it can', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  const [order] = await ordersIn(page, 'in work');
  if (order === undefined) throw new Error('The demo has an order in work');
  await visit(page, `${hidewright.url}/counter/orders/${order.id}`);
  await keyboardAlone.press(page.getByRole('button', { name: 'Move the day' }));
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Packed by').fill(laterDay(order.promisedOn, 400));
  await dialog.getByText(/The bench can do it by/).waitFor();
  const day = laterDay(order.promisedOn, 21);
  await dialog.getByLabel('Packed by').fill(day);
  await keyboardAlone.press(dialog.getByRole('button', { name: 'Promise this day' }));
  await dialog.getByText('Say why the day is moved.').first().waitFor();
  await expectAccessible(page);
  await dialog.getByLabel('Why').fill('The dye has to come again');
  await dialog.getByLabel(/^A word with it/).fill('We are sorry for the wait.');
  await page.setViewportSize(phone);
  await expectAccessible(page);
  await keyboardAlone.press(dialog.getByRole('button', { name: 'Promise this day' }));
  await page.getByText(`${order.number} is promised for`).first().waitFor();
  await page.getByText('Promised first', { exact: true }).waitFor();
  await page.getByText(/: The dye has to come again$/).waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  const [moved] = (await ordersIn(page, 'in work')).filter(({ id }) => id === order.id);
  expect(moved?.promisedOn).toBe(day);
});

walk('the owner cancels an order, and the maker brings back what was taken', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  const [order] = await ordersIn(page, 'in work');
  if (order === undefined) throw new Error('The demo has an order in work');
  await visit(page, `${hidewright.url}/counter/orders/${order.id}`);
  await keyboardAlone.press(page.getByRole('button', { name: 'Cancel the order' }));
  const dialog = page.getByRole('dialog');
  await dialog.getByText(/^Taken already: /).waitFor();
  await expectAccessible(page);
  await keyboardAlone.press(dialog.getByRole('button', { name: 'Cancel the order' }));
  await dialog.getByText('Say why it is cancelled.').first().waitFor();
  await dialog.getByLabel('Why').fill('The inn changed hands');
  await keyboardAlone.press(dialog.getByRole('button', { name: 'Cancel the order' }));
  await page.getByText(`${order.number} is cancelled.`).first().waitFor();
  await page.getByText(/The inn changed hands/).waitFor();
  expect(await page.getByRole('button', { name: 'Move the day' }).count()).toBe(0);
  await expectAccessible(page);
  await page.getByRole('link', { name: 'Write another quote' }).waitFor();

  await page.context().clearCookies();
  await signInAs(page, hidewright.url, 'maker');
  await page.setViewportSize(phone);
  await visit(page, `${hidewright.url}/bench`);
  const open = page.getByRole('region', { name: 'At the bench' });
  expect(await open.getByText(order.job.number).count()).toBe(0);
  await visit(page, `${hidewright.url}/bench/jobs/${order.job.id}`);
  await page.getByText(`${order.number} was cancelled.`).waitFor();
  expect(await page.getByRole('button', { name: /^(Take|Hold|Pause|Finish)/ }).count()).toBe(0);
  const back = page.getByRole('button', { name: /^Bring back/ });
  const taken = await back.count();
  expect(taken).toBeGreaterThan(0);
  await keyboardAlone.press(back.first());
  await expectAccessible(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Bring it back' }));
  await page
    .getByText(/^Back on lot/)
    .first()
    .waitFor();
  await expect.poll(() => back.count()).toBe(taken - 1);
  await keyboardAlone.press(back.last());
  await expectAccessible(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Bring it back' }));
  await page
    .getByText(/: back on the shelf\.$/)
    .first()
    .waitFor();
  await expect.poll(() => back.count()).toBe(taken - 2);
  await expectNoOverflow(page);
});
