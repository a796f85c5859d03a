import type { Page } from 'playwright-core';
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

async function idOf(page: Page, list: string, name: string): Promise<number | undefined> {
  const read = await page.request.get(`${hidewright.url}/api/${list}?limit=200`);
  return ((await read.json()) as Named).items.find((each) => each.name === name)?.id;
}

async function goTo(page: Page, room: string, list: string, name: string): Promise<void> {
  await visit(page, `${hidewright.url}/${room}/${await idOf(page, list, name)}`);
}

async function post(page: Page, list: string, key: string, data: object): Promise<void> {
  const made = await page.request.post(`${hidewright.url}/api/${list}`, {
    headers: { 'Idempotency-Key': key, origin: hidewright.url },
    data,
  });
  expect(made.status()).toBe(201);
}

walk(
  'who sells it, at which price for more, and where a quantity costs least',
  async ({ page }) => {
    await signInAs(page, hidewright.url, 'owner');
    await goTo(page, 'stockroom/hardware', 'hardware', 'Snaps, line 20, brass');
    await page.getByRole('button', { name: 'Add what a supplier asks' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Supplier').selectOption({ label: 'Fennbridge Fittings' });
    await dialog.getByLabel('Price', { exact: true }).fill('0.24');
    await dialog.getByRole('button', { name: 'A lower price for more' }).click();
    await dialog.getByLabel('From').nth(1).fill('1');
    await dialog.getByLabel('Price', { exact: true }).nth(1).fill('0.20');
    await dialog.getByRole('button', { name: 'Add the offer' }).click();
    await dialog
      .getByText('Line 2 begins where line 1 begins. Keep one of the two.')
      .first()
      .waitFor();
    await expectAccessible(page);
    await dialog.getByLabel('From').nth(1).fill('1000');
    await dialog.getByRole('button', { name: 'Add the offer' }).click();
    await page.getByText('usually bought here').waitFor();

    await page.getByRole('button', { name: 'Add what a supplier asks' }).click();
    await dialog.getByLabel('Supplier').selectOption({ label: 'Straightedge Dies' });
    await dialog.getByLabel('Price', { exact: true }).fill('0.225');
    await dialog.getByText('Article number, days, pack').click();
    await dialog.getByLabel(/^Takes/).fill('2');
    await dialog.getByLabel(/^In packs of/).fill('500');
    await dialog.getByRole('button', { name: 'Add the offer' }).click();
    await page.getByRole('heading', { name: 'Straightedge Dies' }).waitFor();

    await page.getByLabel('So many are needed').fill('900');
    await page.getByText('216.00 USD').waitFor();
    await page.getByText('100 more pieces cost 16.00 less: take 1,000 for 200.00.').waitFor();
    await page.getByText(/for 1,000 from Straightedge Dies, in 2 days/).waitFor();
    await page.getByRole('button', { name: 'Use this price of Straightedge Dies' }).click();
    await page.getByText('Quotes reckon with Straightedge Dies’s price now.').first().waitFor();
    await expectAccessible(page);
    await page.setViewportSize(phone);
    await settled(page);
    await expectAccessible(page);
    await expectNoOverflow(page);
    await page.getByRole('link', { name: 'Order it' }).click();
    const supplier = page.getByLabel('Supplier', { exact: true });
    expect(await supplier.locator('option:checked').textContent()).toBe('Straightedge Dies');
  },
);

walk('a kit, and a post that does not suit the folded leather', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await goTo(page, 'stockroom/hardware', 'hardware', 'Rivets 7 mm, antique brass');
  await page.getByText('How it is set').click();
  await page.getByLabel(/^Length of the post/).fill('8');
  await page.getByLabel(/^Holds a stack from/).fill('5.5');
  await page.getByLabel(/^to/).fill('6.5');
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByText('Rivets 7 mm, antique brass is saved.').first().waitFor();

  await visit(page, `${hidewright.url}/stockroom/hardware/new`);
  await page.getByLabel('Name', { exact: true }).fill('Rivets in a bag');
  await page.getByText('Made up of other hardware').click();
  await page.getByRole('button', { name: 'A part' }).click();
  await page
    .getByLabel('Part 1', { exact: true })
    .selectOption({ label: 'Rivet caps 7 mm, nickel' });
  await page.getByRole('button', { name: 'Another part' }).click();
  await page
    .getByLabel('Part 2', { exact: true })
    .selectOption({ label: 'Rivet posts 8 mm, nickel' });
  await page.getByLabel('In each').nth(1).fill('2');
  await page.getByLabel('It costs what its parts cost').check();
  await page.getByRole('button', { name: 'Add it' }).click();
  await page.getByText('Whole kits its parts make up').waitFor();
  await page.getByText('what its parts cost', { exact: true }).waitFor();
  await expectAccessible(page);

  await goTo(page, 'pattern-room/patterns', 'patterns', 'Luggage tag with neck');
  await page
    .getByText(/^.*The post is 8 mm and holds 5.5 to 6.5 mm. Two layers of .* too thin/)
    .first()
    .waitFor();
  await expectAccessible(page);
  await page.getByRole('link', { name: 'Change', exact: true }).click();
  await page
    .getByText(/too thin. Take a shorter one, or add a layer./)
    .first()
    .waitFor();
});

walk('a bin is weighed', async ({ page }) => {
  await page.setViewportSize(phone);
  await signInAs(page, hidewright.url, 'maker');
  await goTo(page, 'stockroom/hardware', 'hardware', 'Rivet caps 7 mm, nickel');
  await page.getByText('Count by weight').click();
  await page.getByLabel('They weigh').fill('12.5');
  await page.getByLabel('All weigh, with the tub').fill('237.5');
  await page.getByLabel('Empty tub').fill('250');
  await page.getByText('All of it weighs less than the empty tub. Weigh both again.').waitFor();
  await page.getByLabel('Empty tub').fill('25');
  await page.getByText('170 pieces, certain to the piece by this scale.').waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  await page.getByRole('button', { name: 'Take 170' }).click();
  await page.getByRole('button', { name: 'Set it' }).click();
  await page.getByText('Adjusted by −30.').first().waitFor();
  expect(await page.getByText(/USD/).count()).toBe(0);
});

const rings = 'Split rings 30 mm, nickel';

walk('a typed order takes the price that its quantity reaches', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await post(page, 'hardware', 'typed-order-walk-1', { name: rings, unitPrice: '0.21' });
  await post(page, 'supplier-offers', 'typed-order-walk-2', {
    supplierId: await idOf(page, 'suppliers', 'Fennbridge Fittings'),
    hardwareId: await idOf(page, 'hardware', rings),
    ...{ minimum: '100', multiple: '50' },
    breaks: [
      { from: '100', price: '0.17' },
      { from: '500', price: '0.14' },
    ],
  });
  await visit(page, `${hidewright.url}/stockroom/purchase-orders/new`);
  const supplier = page.getByLabel('Supplier', { exact: true });
  const price = page.getByLabel('Price', { exact: true });
  const many = page.getByLabel('How many');
  await supplier.selectOption({ label: 'Straightedge Dies' });
  await page.getByRole('button', { name: 'Hardware or supplies' }).click();
  await page.getByLabel('Hardware or supplies', { exact: true }).selectOption({ label: rings });
  await expect.poll(() => price.inputValue()).toBe('0.21');

  await supplier.selectOption({ label: 'Fennbridge Fittings' });
  await expect.poll(() => price.inputValue()).toBe('0.17');
  await many.fill('30');
  await page.getByText('Sold from 100 in packs of 50: order 100.').waitFor();
  await many.fill('450');
  await page.getByText('From 500 they cost 0.14 each: 500 cost 6.50 less than 450.').waitFor();
  await expectAccessible(page);
  await page.setViewportSize(phone);
  await settled(page);
  await expectNoOverflow(page);
  await many.fill('-5');
  await price.focus();
  await page.getByText('Enter 1 or more.').waitFor();
  await page.getByText('There is a sum when every figure is right.').waitFor();
  await many.fill('500');
  await expect.poll(() => price.inputValue()).toBe('0.14');
  await page.getByText(/Together USD 70.00/).waitFor();

  await price.fill('0.13');
  await many.fill('450');
  await page.getByText(/Together USD 58.50/).waitFor();
  expect(await price.inputValue(), 'a typed price stays').toBe('0.13');
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page
    .getByText(/is drafted/)
    .first()
    .waitFor();
  await page.getByRole('link', { name: 'Change', exact: true }).click();
  await settled(page);
  expect(await price.inputValue(), 'a draft is opened as it was saved').toBe('0.13');

  await many.fill('420');
  await page.getByRole('button', { name: 'Save' }).click();
  const remark = `${rings}. Sold in packs of 50: order 400 or 450.`;
  await page.getByText(remark).waitFor();
  await page.getByRole('button', { name: 'Send', exact: true }).click();
  await page.getByRole('dialog').getByText(remark).waitFor();
  await expectAccessible(page);
});

walk('the oldest of more than one page of hardware can be named and seen', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  const oldest = 'Rivet caps 7 mm, nickel';
  const id = await idOf(page, 'hardware', oldest);
  for (let at = 1; at <= 200; at += 1) {
    await post(page, 'hardware', `many-${at}`, { name: `Tack ${at}`, unitPrice: '0.02' });
  }
  await visit(page, `${hidewright.url}/stockroom/hardware`);
  const shown = page.getByRole('link', { name: oldest, exact: true });
  expect(await shown.count()).toBe(0);
  await page.getByRole('button', { name: 'Show earlier hardware and supplies' }).click();
  await shown.waitFor();
  expect(await page.getByRole('button', { name: /^Show earlier/ }).count()).toBe(0);
  await visit(page, `${hidewright.url}/stockroom/purchase-orders/new?hardware=${id}`);
  const chosen = page.getByLabel('Hardware or supplies', { exact: true });
  expect(await chosen.locator('option:checked').textContent()).toBe(oldest);
});
