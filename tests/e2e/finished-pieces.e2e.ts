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
  patternId: number;
  patternName: string;
  customerId: number | null;
  sort: 'good' | 'seconds';
  onHand: number;
}

const open = (role: 'owner' | 'maker', viewport: typeof phone) =>
  signedIn(hidewright.url, role, viewport);

test('a maker gives away from the shelf on a phone, and a new quote says what is left', async () => {
  const { page, complaints, close } = await open('maker', phone);
  await visit(page, `${hidewright.url}/stockroom/finished`);
  await expectNoOverflow(page);
  expect(await page.locator('main').innerText()).not.toContain('At cost');
  const { items } = await readApi<{ items: Piece[] }>(page, 'finished-pieces?there=yes');
  const piece = items.find(({ sort, onHand }) => sort === 'good' && onHand > 1) as Piece;
  await visit(page, `${hidewright.url}/stockroom/finished/${piece.id}`);
  await page.getByRole('heading', { level: 1, name: piece.patternName }).waitFor();
  await expectNoOverflow(page);

  await page.getByText('Given away', { exact: true }).click();
  await page.getByLabel('How many').fill(String(piece.onHand + 1));
  await page.getByLabel('To whom, or why').fill('a sample for the next market');
  await page.getByRole('button', { name: 'Take them' }).click();
  await page.getByText(/are on the shelf, and \d+ cannot be taken/).waitFor();
  await expectAccessible(page);
  await page.getByLabel('How many').fill('1');
  await page.getByRole('button', { name: 'Take them' }).click();
  await page.getByText(`1 given away, ${piece.onHand - 1} left.`).waitFor();
  await page.getByText('a sample for the next market').first().waitFor();
  await page.getByLabel('Place').fill('tray 3');
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByText('The place is saved.').waitFor();
  // The one refusal that the walk provokes.
  expect(complaints.filter((said) => !/status of 409/.test(said))).toEqual([]);
  await close();

  const desk = await open('owner', wide);
  const { patternId, customerId } = piece;
  const address = `/counter/quotes/new?pattern=${patternId}&customer=${customerId ?? ''}`;
  await visit(desk.page, `${hidewright.url}${address}`);
  await desk.page.getByText(/finished ones? .*on the shelf\./).waitFor();
  await desk.page.getByRole('link', { name: 'Finished pieces' }).first().click();
  await desk.page.getByRole('heading', { level: 1, name: 'Finished pieces' }).waitFor();
  await desk.page.getByRole('cell', { name: 'tray 3' }).waitFor();
  await desk.page.getByRole('link', { name: 'Put on the shelf' }).click();
  await desk.page.getByLabel('Pattern').selectOption(String(patternId));
  await desk.page.getByLabel('How many').fill('6');
  await desk.page.getByText('What they cost, and whose mark they bear').click();
  await desk.page.getByLabel('Each cost to make').fill('1.10');
  await desk.page.getByRole('button', { name: 'Put on the shelf' }).click();
  await desk.page.getByText('Say where they come from').first().waitFor();
  await expectAccessible(desk.page);
  await desk.page.getByLabel('Where they come from').fill('found in a box');
  await desk.page.getByRole('button', { name: 'Put on the shelf' }).click();
  await desk.page.getByText(/^6 of .* are put on the shelf\.$/).waitFor();
  await desk.page.getByRole('cell', { name: 'found in a box' }).waitFor();
  expect(desk.complaints).toEqual([]);
  await desk.close();
});

test('a bin is counted by weight on its sheet', async () => {
  const { page, complaints, close } = await open('maker', phone);
  await visit(page, `${hidewright.url}/stockroom/counts`);
  await page.getByRole('button', { name: 'All hardware' }).click();
  await page.getByRole('heading', { level: 1, name: 'All hardware' }).waitFor();
  const line = page.getByRole('listitem').filter({ hasText: 'Count by weight' }).first();
  await line.getByText('Count by weight').click();
  await line.getByLabel('They weigh').fill('8.0');
  await line.getByLabel('All weigh, with the tub').fill('120.0');
  await expectAccessible(page);
  await expectNoOverflow(page);
  await line.getByRole('button', { name: 'Take 150' }).click();
  await page.getByText('1 of').waitFor();
  expect(await line.getByRole('textbox').first().inputValue()).toBe('150');
  expect(complaints).toEqual([]);
  await close();
});

interface Order {
  id: number;
  number: string;
  lines: { name: string; toCome: { areaMm2: string | null; quantity: number | null } }[];
}

test('an owner closes one line of an order, it is short, and is awaited after all', async () => {
  const { page, complaints, close } = await open('owner', wide);
  const { items } = await readApi<{ items: Order[] }>(page, 'purchase-orders?awaited=yes');
  const isOpen = ({ toCome }: Order['lines'][number]) =>
    Number(toCome.areaMm2 ?? toCome.quantity) > 0;
  const order = items.find(({ lines }) => lines.filter(isOpen).length > 1) as Order;
  const line = order.lines.find(isOpen) as Order['lines'][number];
  await visit(page, `${hidewright.url}/stockroom/purchase-orders/${order.id}`);
  await page.getByRole('button', { name: `Nothing more of ${line.name}` }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Nothing more comes' }).click();
  await page.getByText('Say why, in a few words.').first().waitFor();
  await expectAccessible(page);
  await page.getByLabel('Why').fill('sold out there');
  await page.getByRole('dialog').getByRole('button', { name: 'Nothing more comes' }).click();
  await page.getByText(`${line.name} is closed short.`).waitFor();
  await page
    .getByRole('row')
    .filter({ hasText: line.name })
    .getByText(/ short$/)
    .waitFor();
  await page.getByRole('button', { name: `Await the rest of ${line.name}` }).click();
  await expectAccessible(page);
  await page.getByRole('dialog').getByRole('button', { name: 'Await it' }).click();
  await page.getByText(`${line.name} is awaited again.`).waitFor();
  await page.getByRole('button', { name: `Nothing more of ${line.name}` }).waitFor();
  expect(complaints).toEqual([]);
  await close();
});
