import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { closeBrowser, phone, wide } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { readApi, signedIn } from '../support/signed-in.ts';
import { expectAccessible, expectNoOverflow, visit } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

interface Piece {
  id: number;
  patternName: string;
  customerId: number | null;
  sort: 'good' | 'seconds';
  onHand: number;
}

const open = (role: 'owner' | 'maker', viewport: typeof phone) =>
  signedIn(hidewright.url, role, viewport);

const shelf = async (page: Page) =>
  (await readApi<{ items: Piece[] }>(page, 'finished-pieces?there=yes')).items;
const now = (page: Page, { id }: Piece) => readApi<Piece>(page, `finished-pieces/${id}`);

async function sellAs(page: Page, piece: Piece, typed: { customer?: string; quantity: number }) {
  await visit(page, `${hidewright.url}/stockroom/finished/${piece.id}`);
  await page.getByRole('link', { name: 'Sell with an invoice' }).click();
  await page.getByRole('heading', { level: 1, name: 'Sell from the shelf' }).waitFor();
  if (typed.customer)
    await page.getByLabel('Customer', { exact: true }).selectOption({ label: typed.customer });
  await page.getByLabel('How many').fill(String(typed.quantity));
}

const take = (page: Page) => page.getByRole('button', { name: 'Sell them' }).click();

test('an owner sells seconds from the shelf, adds to the draft, issues it and is paid', async () => {
  const { page, complaints, close } = await open('owner', wide);
  const free = (await shelf(page)).filter(({ customerId }) => customerId === null);
  const second = free.find(({ sort }) => sort === 'seconds') as Piece;
  const first = free.find(({ sort }) => sort === 'good') as Piece;

  await sellAs(page, second, { customer: 'Quillfeather Books', quantity: second.onHand + 1 });
  await take(page);
  await page.getByText('Enter a price such as').first().waitFor();
  await expectAccessible(page);
  await page.getByLabel('Price each').fill('0.05');
  await page.getByText('That is less than their leather and hardware cost').waitFor({
    state: 'detached',
  });
  await take(page);
  await page.getByText(/are on the shelf, and \d+ cannot be taken/).waitFor();
  await page.getByLabel('How many').fill('2');
  await page.getByText('That is less than their leather and hardware cost').waitFor();
  await page.getByLabel('Price each').fill('1.25');
  await page.getByText('2.50').first().waitFor();
  await take(page);
  await page.getByText('Draft invoice', { exact: true }).first().waitFor();
  await page.getByText('Pieces from the shelf').waitFor();
  await expectAccessible(page);
  expect(await now(page, second)).toMatchObject({ onHand: second.onHand - 2 });

  await page.getByRole('link', { name: 'Add from the shelf' }).click();
  await page.getByText('What Quillfeather Books could have').waitFor();
  await expectAccessible(page);
  await page.getByRole('link', { name: `Sell ${first.patternName}`, exact: true }).click();
  await page.getByText('Add to their draft').waitFor();
  await page.getByLabel('How many').fill('1');
  await page.getByLabel('Price each').fill('1.9');
  await expectAccessible(page);
  await take(page);
  const putBack = page.getByRole('button', { name: `Put back ${second.patternName}` });
  await putBack.nth(1).waitFor();
  await expectAccessible(page);
  await putBack.first().click();
  await page.getByRole('alertdialog').getByText('lie on the shelf again').waitFor();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Put back on the shelf', exact: true }).click();
  await page.getByText(/: on the shelf again\.$/).waitFor();
  expect(await now(page, second)).toMatchObject({ onHand: second.onHand });

  await page.getByRole('button', { name: 'Issue', exact: true }).click();
  await page.getByRole('button', { name: 'Issue the invoice' }).click();
  await page.getByText(/^Invoice I-\d+ is issued\.$/).waitFor();
  const buyer = (
    await readApi<{ customerId: number }>(page, `invoices/${page.url().split('/').pop()}`)
  ).customerId;
  const paper = await page.getByRole('link', { name: 'PDF' }).getAttribute('href');
  const file = await page.request.get(new URL(paper ?? '', hidewright.url).href);
  expect((await file.body()).subarray(0, 5).toString()).toBe('%PDF-');
  await page.getByRole('button', { name: 'Record a payment' }).click();
  await page.getByText('In cash').click();
  await page.getByRole('button', { name: 'Record the payment' }).click();
  await page.getByText(/^I-\d+ is paid\.$/).waitFor();
  await page.getByRole('link', { name: first.patternName }).click();
  await page
    .getByRole('link', { name: /^I-\d+$/ })
    .first()
    .waitFor();
  await page.goto(`${hidewright.url}/counter/customers/${buyer}`);
  await page.getByRole('cell', { name: 'Pieces from the shelf' }).first().waitFor();
  await expectAccessible(page);
  // The one refusal that the walk provokes.
  expect(complaints.filter((said) => !/status of 409/.test(said))).toEqual([]);
  await close();
});

test('pieces with a mark go to that customer, and a discarded draft lays them back', async () => {
  const { page, complaints, close } = await open('owner', phone);
  const piece = (await shelf(page)).find(
    ({ customerId, onHand }) => customerId !== null && onHand > 1,
  );
  const marked = piece as Piece;
  await sellAs(page, marked, { quantity: 1 });
  await page.getByText('they bear their mark').waitFor();
  expect(await page.getByLabel('Customer', { exact: true }).count()).toBe(0);
  await page.getByLabel('Price each').fill('4');
  await expectNoOverflow(page);
  await expectAccessible(page);
  await take(page);
  await page.getByText('Pieces from the shelf').waitFor();
  await expectNoOverflow(page);
  await page.getByRole('button', { name: 'Discard' }).click();
  await page.getByText('Its pieces lie on the shelf again.').waitFor();
  await page.getByRole('button', { name: 'Discard the draft' }).click();
  await page.getByText(/^The draft for .* is discarded\.$/).waitFor();
  await visit(page, `${hidewright.url}/stockroom/finished/${marked.id}`);
  await page.getByText('put back', { exact: true }).first().waitFor();
  expect(await now(page, marked)).toMatchObject({ onHand: marked.onHand });
  expect(complaints).toEqual([]);
  await close();
});

test('a maker takes from the shelf, and sees neither price nor a way to sell', async () => {
  const { page, complaints, close } = await open('maker', phone);
  const [piece] = await shelf(page);
  await visit(page, `${hidewright.url}/stockroom/finished/${piece?.id}`);
  await page.getByText('Sold over the counter').waitFor();
  expect(await page.getByRole('link', { name: 'Sell with an invoice' }).count()).toBe(0);
  expect(await page.locator('main').innerText()).not.toContain('At cost');
  expect(complaints).toEqual([]);
  await close();
});
