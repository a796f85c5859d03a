import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect } from 'vitest';
import { browser, closeBrowser, phone, still } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { mailThat } from '../support/mailbox.ts';
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

interface Order {
  id: number;
  number: string;
  lines: { id: number; leatherId: number | null; hardwareId: number | null }[];
}

async function draftOrder(page: Page): Promise<Order> {
  const named = async (path: string, name: string) => {
    const { items } = (await (
      await page.request.get(`${hidewright.url}/api/${path}?limit=200`)
    ).json()) as { items: { id: number; name: string }[] };
    return items.find((item) => item.name === name)?.id;
  };
  const made = await page.request.post(`${hidewright.url}/api/purchase-orders`, {
    headers: { 'Idempotency-Key': 'receiving-walk-1', origin: hidewright.url },
    data: {
      supplierId: await named('suppliers', 'Oldbeck Tannery'),
      lines: [
        {
          of: 'leather',
          leatherId: await named('leathers', 'Oak tan natural 7–8 oz'),
          areaMm2: '4645152',
          unitPrice: '11.80',
        },
        {
          of: 'hardware',
          hardwareId: await named('hardware', 'Snaps, line 20, brass'),
          quantity: 500,
          unitPrice: '0.24',
        },
      ],
    },
  });
  expect(made.status()).toBe(201);
  return (await made.json()) as Order;
}

walk(
  'an order goes out on paper, comes in part by part, and what is short is claimed',
  async ({ page }) => {
    await signInAs(page, hidewright.url, 'owner');
    const order = await draftOrder(page);
    await visit(page, `${hidewright.url}/stockroom/purchase-orders/${order.id}`);
    await page.getByRole('button', { name: 'Send', exact: true }).click();
    const sending = page.getByRole('dialog');
    await expectAccessible(page);
    await sending.getByRole('button', { name: 'Send it' }).click();
    await page.getByText(`${order.number} is sent.`).first().waitFor();
    const sent = await mailThat(hidewright.mailboxUrl, ({ subject }) =>
      subject.includes(order.number),
    );
    expect(sent.to).toContain('hides@oldbeck.example.com');
    const paper = await page.request.get(`${hidewright.url}/api/purchase-orders/${order.id}/paper`);
    expect((await paper.body()).subarray(0, 5).toString()).toBe('%PDF-');

    const context = await (await browser()).newContext({ ...still, viewport: phone });
    const maker = await context.newPage();
    await signInAs(maker, hidewright.url, 'maker');
    await visit(maker, `${hidewright.url}/stockroom/receive`);
    await expectNoOverflow(maker);
    const number = maker.getByLabel('Number of the order');
    await number.fill('T-0001');
    await number.press('Enter');
    await maker.getByText(/T-0001 is no order to a supplier/).waitFor();
    await number.fill(order.number.toLowerCase());
    await number.press('Enter');
    await maker.waitForURL('**/stockroom/receive?order=*');
    await settled(maker);

    const lot = (at: number) => maker.getByRole('group', { name: `Lot ${at}`, exact: true });
    await lot(1)
      .getByLabel(/^Marked area/)
      .fill('24³');
    await lot(1).getByLabel('Measured area').fill('24.5');
    await lot(1)
      .getByText(/less than marked/)
      .waitFor();
    await lot(1)
      .getByLabel(/^Shade/)
      .fill('pale');
    await lot(1)
      .getByLabel(/^Place/)
      .fill('rack 3');
    const tag = lot(1).getByLabel(/^Tag/);
    await tag.fill('HUNG-71');
    await tag.press('Enter');
    await maker.getByLabel(/^Came/).first().fill('200');
    await maker.getByLabel(/^Batch/).fill('SN-88');
    // In the same parcel, and on no order.
    await maker.getByRole('button', { name: 'Other hardware came with it' }).click();
    const other = maker.getByRole('group', { name: 'Hardware 2', exact: true });
    await other.getByLabel('Hardware or supplies').selectOption({ index: 2 });
    await other.getByLabel(/^Came/).fill('50');
    await expectAccessible(maker);
    await expectNoOverflow(maker);
    await maker.reload();
    await settled(maker);
    expect(await lot(1).getByLabel(/^Tag/).inputValue()).toBe('HUNG-71');
    await maker.getByRole('button', { name: 'Put it on the rack' }).click();
    await maker.getByRole('heading', { name: 'Received', level: 1 }).waitFor();
    await maker.getByRole('link', { name: 'HUNG-71' }).waitFor();
    await expectAccessible(maker);

    await maker.getByRole('button', { name: 'Receive more' }).click();
    await lot(1)
      .getByLabel(/^Marked area/)
      .fill('25.5');
    await lot(1).getByLabel('Measured area').fill('24');
    await lot(1)
      .getByText(/Short of its mark/)
      .waitFor();
    await expectAccessible(maker);

    // Meanwhile the owner has counted 100 snaps in at the bench.
    const [, snaps] = order.lines;
    const quicker = await page.request.post(`${hidewright.url}/api/receipts`, {
      headers: { 'Idempotency-Key': 'receiving-walk-2', origin: hidewright.url },
      data: {
        purchaseOrderId: order.id,
        hardware: [{ hardwareId: snaps?.hardwareId, purchaseLineId: snaps?.id, quantity: 100 }],
      },
    });
    expect(quicker.status()).toBe(201);
    const before = maker.getByRole('button', { name: 'Put it on the rack' });
    await before.click();
    await maker
      .getByText(/has received 100 × Snaps/)
      .first()
      .waitFor();
    await expectAccessible(maker);
    await maker.getByRole('button', { name: 'Take out what is here already' }).click();
    await expect.poll(() => maker.getByLabel(/^Came/).first().inputValue()).toBe('200');
    await before.click();
    await maker.getByRole('heading', { name: 'Received', level: 1 }).waitFor();
    await maker.getByText(/Short of the mark/).waitFor();
    await context.close();

    await visit(page, `${hidewright.url}/stockroom/purchase-orders/${order.id}`);
    await page.getByRole('button', { name: 'Do not claim' }).press('Enter');
    await page.getByRole('dialog').getByRole('button', { name: 'Do not claim' }).press('Enter');
    await page.getByText(/smaller than marked \(Ines Okafor-Lund, /).waitFor();
    // On second thoughts.
    await page.getByRole('button', { name: 'Claim it' }).click();
    const claim = page.getByRole('dialog');
    const letter = claim.getByLabel('What you write');
    await letter.waitFor();
    expect(await letter.inputValue()).toContain('marked 25.5 ft², measured 24 ft²');
    await expectAccessible(page);
    await claim.getByRole('button', { name: 'Claim it' }).click();
    await page.getByText('The claim is on its way.').first().waitFor();
    const claimed = await mailThat(hidewright.mailboxUrl, ({ subject }) =>
      subject.includes(`${order.number}: leather smaller`),
    );
    expect(claimed.text).toContain('1.5 ft² is missing');
    await page.getByText(/1.5 ft² missing, worth USD 17.70/).waitFor();

    await page.getByRole('button', { name: 'Put right what it cost' }).first().click();
    const costs = page.getByRole('dialog');
    await costs.getByLabel(/^Freight/).fill('12.34');
    await costs.getByLabel(/^Paid for Snaps/).fill('49.00');
    await expectAccessible(page);
    await costs.getByRole('button', { name: 'Save the cost' }).click();
    await page.getByText(/freight 12.34, shared out by value/).waitFor();
    await page.getByText('USD 1.00 more than ordered.').waitFor();
    await page.getByRole('button', { name: 'Let the price stand' }).click();
    const standing = page.getByRole('dialog');
    await standing.getByLabel(/^Why/).fill('A new price list');
    await expectAccessible(page);
    await standing.getByRole('button', { name: 'Let it stand' }).click();
    await page.getByText(/USD 1.00 more than ordered: A new price list \(Ines/).waitFor();
    await page.getByRole('button', { name: 'Send something back' }).click();
    const back = page.getByRole('dialog');
    await back.getByLabel('What', { exact: true }).selectOption({ label: 'Snaps, line 20, brass' });
    await back.getByLabel('How many').fill('50');
    await back.getByLabel('Why').fill('Caps bent');
    await back.getByRole('button', { name: 'Send it back' }).click();
    await page.getByText('Snaps, line 20, brass is off the rack.').first().waitFor();
    await expectAccessible(page);
    await page.setViewportSize(phone);
    await settled(page);
    await expectNoOverflow(page);
  },
);

walk('what came without an order is listed, and what it cost is put right', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/stockroom/receive?order=none`);
  await page.getByRole('button', { name: 'A lot of leather' }).click();
  const lot = page.getByRole('group', { name: 'Lot 1', exact: true });
  await lot
    .getByLabel('Leather', { exact: true })
    .selectOption({ label: 'Oak tan natural 7–8 oz' });
  await lot.getByLabel(/^Marked area/).fill('25');
  await lot.getByLabel('Measured area').fill('20');
  const shortfall = lot.getByText(/It misses 5(\.0)? ft²/).last();
  await shortfall.waitFor();
  expect(await shortfall.textContent()).not.toContain('claim');
  await lot.getByLabel(/^Tag/).fill('MKT-1');
  await lot.getByRole('button', { name: /^Weight, grade/ }).click();
  await lot.getByLabel(/^Weight/).fill('2.4 mm');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Put it on the rack' }).click();
  const title = page.getByRole('heading', { level: 1, name: 'Received' });
  await title.waitFor();
  expect(await title.evaluate((each) => each === document.activeElement)).toBe(true);
  await page.getByRole('link', { name: 'To the delivery' }).click();
  await page.waitForURL('**/stockroom/deliveries');
  const card = page.getByRole('region').filter({ hasText: 'MKT-1' }).first();
  await card.getByText('One lot is short of its mark.').waitFor();
  expect(await card.getByRole('button', { name: 'Claim it' }).count()).toBe(0);
  await card.getByRole('button', { name: 'Put right what it cost' }).click();
  const costs = page.getByRole('dialog');
  await costs.getByLabel(/^Freight/).fill('7.50');
  await costs.getByRole('button', { name: 'Save the cost' }).click();
  await page.getByText(/freight 7.50, shared out by value/).waitFor();
  await expectAccessible(page);
  await page.setViewportSize(phone);
  await settled(page);
  await expectNoOverflow(page);
  await card.getByRole('link', { name: 'MKT-1' }).click();
  await page.getByText('6.05 oz (2.4 mm)').waitFor();
  const lies = page.getByRole('region', { name: 'Where it lies' });
  await lies.getByLabel(/^Weight/).fill('5½');
  await lies.getByRole('button', { name: 'Save' }).click();
  await page.getByText('5.5 oz (2.2 mm)').waitFor();
  await expectNoOverflow(page);
});
