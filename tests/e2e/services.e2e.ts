import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { browser, closeBrowser, phone, still, watch, wide } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { settled, signInAs } from '../support/steps.ts';
import { expectAccessible, expectNoOverflow } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

interface Lots {
  items: {
    id: number;
    tag: string;
    leatherName: string;
    onHandAreaMm2: string;
    freeAreaMm2: string;
  }[];
}

/** A lot of which all is free. */
async function freeLot(page: Page) {
  const reply = await page.request.get(`${hidewright.url}/api/lots?onRack=yes&limit=200`);
  const { items } = (await reply.json()) as Lots;
  const lot = items.find(({ onHandAreaMm2, freeAreaMm2 }) => onHandAreaMm2 === freeAreaMm2);
  if (lot === undefined) throw new Error('The demo has no lot that is free');
  return lot;
}

async function goTo(page: Page, path: string): Promise<void> {
  await page.goto(`${hidewright.url}${path}`);
  await settled(page);
}

test('a lot goes out to be split, and comes back as grain and flesh', async () => {
  const desk = await (await browser()).newContext({ ...still, viewport: wide });
  const page = await desk.newPage();
  const complaints = watch(page);
  await signInAs(page, hidewright.url, 'owner');
  const lot = await freeLot(page);
  await goTo(page, '/stockroom/purchase-orders/new');
  const asked: string[] = [];
  page.on('request', (request) => asked.push(new URL(request.url()).pathname));
  await page.getByRole('button', { name: 'Hardware or supplies' }).click();
  await page.reload();
  await settled(page);
  expect(asked).toContain('/api/hardware');
  expect(asked, 'goods take no lot along').not.toContain('/api/lots');
  await page.getByRole('button', { name: 'Work on a lot' }).click();
  await page
    .getByLabel('Lot that goes out')
    .locator('option', { hasText: lot.tag })
    .waitFor({ state: 'attached' });

  await goTo(page, `/stockroom/lots/${lot.id}`);
  await page.getByRole('link', { name: 'Have it worked on' }).click();
  await page.waitForURL('**/new?lot=*');
  await settled(page);
  await page.getByLabel('Supplier', { exact: true }).selectOption({ label: 'Fenside Dye Works' });
  const line = page.getByRole('group', { name: 'Line 1: work on a lot' });
  await line.getByLabel('Work', { exact: true }).selectOption('splitting');
  await line.getByLabel('Becomes').selectOption({ label: 'Shoulder natural 3–4 oz' });
  await line.getByLabel(/^Area/).fill('900');
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page.getByText('Enter the price per ft², or for the lot.').first().waitFor();
  await line.getByLabel(/^Or for the lot/).fill('25.01');
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page
    .getByText(/is free\. Enter at most that\.$/)
    .first()
    .waitFor();
  await expectAccessible(page);
  await line.getByLabel(/^Area/).fill('');
  await page.getByRole('button', { name: 'Save the draft' }).click();

  const name = `Splitting of ${lot.tag}, ${lot.leatherName}`;
  await page.getByRole('link', { name }).waitFor();
  await page.getByRole('button', { name: 'Send', exact: true }).click();
  const sending = page.getByRole('dialog');
  await sending.getByText(`${lot.tag} goes off the rack with it.`).waitFor();
  await sending.getByText('By hand', { exact: true }).click();
  await sending.getByRole('button', { name: 'Send it' }).click();
  await page
    .getByText(/is sent\.$/)
    .first()
    .waitFor();
  await page.getByRole('link', { name }).click();
  await page.getByText(/ft² out for splitting/).waitFor();
  await page.getByText(/at Fenside Dye Works, P-\d+, awaited/).waitFor();
  await expectAccessible(page);

  const context = await (await browser()).newContext({ ...still, viewport: phone });
  const maker = await context.newPage();
  const heard = watch(maker);
  await signInAs(maker, hidewright.url, 'maker');
  await goTo(maker, '/stockroom/receive');
  await maker.getByRole('link', { name: new RegExp(name) }).click();
  await maker.waitForURL('**/receive?order=*');
  await settled(maker);
  const came = (at: number) => maker.getByRole('group', { name: `Lot ${at}`, exact: true });
  expect(await came(1).getByLabel('Measured area').inputValue()).not.toBe('');
  await maker.getByRole('button', { name: `Another lot from ${lot.tag}` }).click();
  await came(2).getByLabel('Measured area').fill('18.5');
  await came(2).getByLabel('It is now').selectOption({ label: 'Chestnut lining 3–4 oz' });
  await came(2)
    .getByLabel(/^Shade/)
    .fill('flesh');
  await expectAccessible(maker);
  await expectNoOverflow(maker);
  await maker.getByRole('button', { name: 'Put it on the rack' }).click();
  await maker.getByText(/Chestnut lining 3–4 oz, \w+, 18.5 ft²/).waitFor();
  await maker
    .getByRole('link', { name: /^T-\d+$/ })
    .last()
    .click();
  await maker.getByText('this lot, after splitting', { exact: false }).waitFor();
  const family = maker.getByRole('list', { name: 'Cut from one another' });
  await family.getByRole('link', { name: lot.tag }).waitFor();
  await expectAccessible(maker);
  await expectNoOverflow(maker);
  await context.close();
  await desk.close();
  // The browser itself says that more than is free was refused.
  expect(complaints.filter((said) => !/status of 422/.test(said))).toEqual([]);
  expect(heard).toEqual([]);
});
