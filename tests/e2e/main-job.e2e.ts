import { afterAll, afterEach, beforeEach, expect } from 'vitest';
import type { Page } from 'playwright-core';
import { browser, closeBrowser, phone, still, watch, wide } from '../support/browser.ts';
import { keyboardAlone, mouse, type Hands } from '../support/hands.ts';
import { daysFromNow } from '../support/days.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { mailThat } from '../support/mailbox.ts';
import { settled, type Role } from '../support/steps.ts';
import { expectAccessible, idIn, visit, walk } from '../support/walk.ts';

const quantity = 60;

let hidewright: Hidewright;
let complaints: string[];
let hands: Hands;

beforeEach(async () => {
  hidewright = await startDemo();
  complaints = [];
});
afterEach(() => hidewright.stop());
afterAll(closeBrowser);

/** A browser of this person's own, at the width they work at. */
async function desk(role: Role, viewport = wide): Promise<Page> {
  const context = await (await browser()).newContext({ ...still, viewport, acceptDownloads: true });
  const page = await context.newPage();
  complaints = watch(page);
  await page.goto(`${hidewright.url}/sign-in`);
  await hands.press(page.getByRole('button', { name: new RegExp(`, ${role}`) }));
  await page.waitForURL('**/today');
  await settled(page);
  return page;
}

async function leave(page: Page): Promise<void> {
  await page.context().close();
  expect(complaints, 'the page complained').toEqual([]);
}

/** By keyboard alone everywhere; by mouse as well where there is time for both. */
const ways = process.env['CI'] === 'true' ? [keyboardAlone] : [mouse, keyboardAlone];

walk.for(ways)(
  'one run of coasters, from the enquiry to the locked sales sheet, by $name',
  async (by) => {
    hands = by;
    const { quoteAddress, number } = await ownerQuotes();
    await customerAgrees(number);
    const { orderAddress, jobAddress } = await ownerTakesOn(quoteAddress);
    await makerWorks(jobAddress);
    const orderNumber = await ownerShips(jobAddress, orderAddress);
    const invoiceNumber = await bookkeeperInvoices(orderNumber);
    await bookkeeperLocks(invoiceNumber);
  },
);

async function ownerQuotes(): Promise<{ quoteAddress: string; number: string }> {
  const page = await desk('owner');
  await expectAccessible(page);
  await visit(page, `${hidewright.url}/counter/quotes/new`);
  await hands.choose(page.getByLabel('Customer', { exact: true }), 'Brambling Brewery');
  await hands.choose(page.getByLabel('Pattern', { exact: true }), 'Drinks coaster, round');
  await hands.fill(page.getByLabel(/What the customer calls it/), 'Spring ale coasters');
  await hands.fill(page.getByLabel(/^In hands/), daysFromNow(42));
  await hands.fill(page.getByLabel('Pieces').first(), String(quantity));
  await page.getByText('worked out:').first().waitFor();
  await expectAccessible(page);
  await hands.press(page.getByRole('button', { name: 'Save the draft' }));
  await page.waitForURL(/\/counter\/quotes\/\d+$/);
  await settled(page);
  await expectAccessible(page);
  const quoteAddress = page.url();
  const number = /Q-\d+/.exec(await page.getByRole('main').innerText())?.[0] ?? '';
  await hands.press(page.getByRole('button', { name: 'Send quote' }));
  await expectAccessible(page);
  await hands.press(page.getByRole('button', { name: 'Send by mail' }));
  await page.getByRole('button', { name: 'Send again' }).waitFor();
  await leave(page);
  return { quoteAddress, number };
}

async function customerAgrees(number: string): Promise<void> {
  const mail = await mailThat(hidewright.mailboxUrl, ({ subject }) => subject.includes(number));
  expect(mail.to).toContain('taproom@brambling.example.com');
  const link = mail.links.find((each) => each.includes('/c/'));
  const context = await (await browser()).newContext({ ...still, viewport: phone });
  const page = await context.newPage();
  complaints = watch(page);
  await page.goto(link ?? '');
  await settled(page);
  await expectAccessible(page);
  await hands.check(page.getByRole('radio', { name: new RegExp(`^${quantity}`) }));
  await hands.press(page.getByRole('button', { name: new RegExp(`^Agree to ${quantity}`) }));
  await page.getByRole('heading', { name: `You agreed to ${quantity}` }).waitFor();
  await expectAccessible(page);
  await leave(page);
}

async function ownerTakesOn(
  quoteAddress: string,
): Promise<{ orderAddress: string; jobAddress: string }> {
  const page = await desk('owner');
  await visit(page, quoteAddress);
  await page.getByRole('heading', { name: 'Can we make it?' }).waitFor();
  await page.getByText(/^Yes, by/).waitFor();
  await hands.press(page.getByRole('button', { name: /^Take it on/ }));
  await page.waitForURL(/\/counter\/orders\/\d+$/);
  await settled(page);
  await expectAccessible(page);
  const orderAddress = page.url();
  await hands.press(page.getByRole('link', { name: 'Open the ticket' }));
  await page.waitForURL(/\/bench\/jobs\/\d+$/);
  const jobAddress = page.url();
  expect(idIn(jobAddress)).toBeGreaterThan(0);
  await leave(page);
  return { orderAddress, jobAddress };
}

async function makerWorks(jobAddress: string): Promise<void> {
  const page = await desk('maker', phone);
  await expectAccessible(page);
  await visit(page, `${hidewright.url}/bench`);
  await visit(page, jobAddress);
  const held = page.getByRole('button', { name: /^Take [\d.,]+/ });
  while ((await held.count()) > 0) {
    const before = await held.count();
    await hands.press(held.first());
    await expect.poll(() => held.count(), { timeout: 30_000 }).toBeLessThan(before);
  }
  await workEveryStep(page);
  await expectAccessible(page);
  await hands.press(page.getByRole('button', { name: 'Finish and pack' }));
  await page.getByText('finished').first().waitFor();
  await settled(page);
  await expectAccessible(page);
  expect(await page.getByRole('main').innerText()).not.toMatch(/margin|per bench hour|price/i);
  await leave(page);
}

/** One reject on the first step that counts pieces; everything else goes through. */
async function workEveryStep(page: Page): Promise<void> {
  const steps = page.getByRole('list', { name: 'Steps' }).getByRole('listitem');
  const names = await steps.getByRole('heading').getByRole('button').allInnerTexts();
  for (const [at] of names.entries()) {
    const head = steps.nth(at).getByRole('heading').getByRole('button');
    if ((await head.getAttribute('aria-expanded')) !== 'true') await hands.press(head);
    const all = steps.nth(at).getByRole('button', { name: /^\+ (all|row)/ });
    if (at === 1)
      await hands.press(steps.nth(at).getByRole('button', { name: 'Reject', exact: true }));
    if ((await all.count()) > 0) await hands.press(all.last());
    else await hands.press(steps.nth(at).getByRole('button', { name: 'One good piece more' }));
    await hands.press(steps.nth(at).getByRole('button', { name: /\+ ?5/ }).first());
    const logged = page.waitForResponse((reply) => reply.url().endsWith('/logs'));
    await hands.press(steps.nth(at).getByRole('button', { name: /^Log / }));
    expect((await logged).status()).toBe(201);
    await expect
      .poll(() => steps.nth(at).getByRole('button', { name: /^Log / }).count(), { timeout: 30_000 })
      .toBe(0);
  }
}

async function ownerShips(jobAddress: string, orderAddress: string): Promise<string> {
  const page = await desk('owner');
  await visit(page, jobAddress);
  await page.getByRole('heading', { name: 'Estimate and fact' }).waitFor();
  await visit(page, orderAddress);
  await hands.press(page.getByRole('button', { name: 'It has left the shop' }));
  await page.getByText('shipped').first().waitFor();
  await expectAccessible(page);
  const number = /O-\d+/.exec(await page.getByRole('main').innerText())?.[0] ?? '';
  await leave(page);
  return number;
}

async function bookkeeperInvoices(orderNumber: string): Promise<string> {
  const page = await desk('bookkeeper');
  await expectAccessible(page);
  await visit(page, `${hidewright.url}/books/invoices`);
  const waiting = page
    .getByRole('region', { name: 'To be invoiced' })
    .getByRole('article')
    .filter({ hasText: orderNumber });
  await hands.press(waiting.getByRole('link').last());
  await settled(page);
  await expectAccessible(page);
  await hands.press(page.getByRole('button', { name: 'Draft the invoice' }));
  await page.waitForURL(/\/books\/invoices\/\d+$/);
  await hands.press(page.getByRole('button', { name: /^Issue/ }));
  await hands.press(page.getByRole('dialog').getByRole('button', { name: 'Issue the invoice' }));
  await page
    .getByText(/^I-\d+$/)
    .first()
    .waitFor();
  await settled(page);
  await expectAccessible(page);
  const number = /I-\d+/.exec(await page.getByRole('main').innerText())?.[0] ?? '';
  await hands.press(page.getByRole('button', { name: /[Pp]ayment/ }));
  await expectAccessible(page);
  await hands.press(page.getByRole('dialog').getByRole('button', { name: 'Record the payment' }));
  await page.getByText('paid', { exact: true }).first().waitFor();
  await leave(page);
  return number;
}

async function bookkeeperLocks(invoiceNumber: string): Promise<void> {
  const page = await desk('bookkeeper');
  const today = daysFromNow(0);
  await visit(page, `${hidewright.url}/books/sales-sheets?from=${today.slice(0, 8)}01&to=${today}`);
  await page.getByText(invoiceNumber).first().waitFor();
  const download = page.waitForEvent('download');
  await hands.press(page.getByRole('link', { name: /spreadsheet|\.xlsx|Download/i }).first());
  expect((await download).suggestedFilename()).toMatch(/\.xlsx$/);
  await hands.press(page.getByRole('button', { name: 'Lock these days' }));
  await expectAccessible(page);
  await hands.press(page.getByRole('button', { name: 'Lock them' }));
  await page.getByText('Locked.').first().waitFor();
  await expectAccessible(page);
  await leave(page);
}
