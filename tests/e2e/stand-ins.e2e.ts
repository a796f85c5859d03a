import { afterAll, beforeAll, expect } from 'vitest';
import type { Page } from 'playwright-core';
import { closeBrowser, phone } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { readApi } from '../support/signed-in.ts';
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

const kraft = 'Card sleeves, kraft';
const plain = 'Card sleeves, plain';

walk('the maker takes on the ticket what may stand in for what is needed', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await bringStandIn(page);
  await page.context().clearCookies();
  await page.setViewportSize(phone);
  await signInAs(page, hidewright.url, 'maker');
  const { items } = await readApi<{ items: { id: number; title: string; state: string }[] }>(
    page,
    'jobs?open=true',
  );
  const job = items.find(({ title }) => title === 'Winter ale coasters');
  await visit(page, `${hidewright.url}/bench/jobs/${job?.id}`);

  await keyboardAlone.press(page.getByRole('button', { name: 'Take other hardware' }));
  const dialog = page.getByRole('dialog');
  await keyboardAlone.choose(
    dialog.getByLabel('Hardware'),
    `${plain}: 40 free, can stand in for ${kraft}`,
  );
  await expectAccessible(page);
  await dialog.getByLabel('How many').fill('30');
  await keyboardAlone.press(dialog.getByRole('button', { name: 'Take it' }));

  await page.getByText(`can stand in for ${kraft} · 30 taken · 10 free`).waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  const ticket = await readApi<{ hardware: { name: string; taken: number }[] }>(
    page,
    `jobs/${job?.id}`,
  );
  expect(ticket.hardware).toContainEqual(expect.objectContaining({ name: plain, taken: 30 }));
});

/** Forty plain sleeves on the shelf, which may be taken in place of kraft ones. */
async function bringStandIn(page: Page): Promise<void> {
  const sent = { name: plain, kind: 'supplies', unitPrice: '0.08' };
  const added = await page.request.post(`${hidewright.url}/api/hardware`, { data: sent });
  const { id } = (await added.json()) as { id: number };
  const hardware = [{ hardwareId: id, quantity: 40 }];
  await page.request.post(`${hidewright.url}/api/receipts`, { data: { hardware } });
  const { items } = await readApi<{ items: { id: number; name: string; version: number }[] }>(
    page,
    'hardware?limit=200',
  );
  const needed = items.find(({ name }) => name === kraft);
  const changed = await page.request.patch(`${hidewright.url}/api/hardware/${needed?.id}`, {
    headers: { 'If-Match': `"${needed?.version}"` },
    data: { standIns: [{ hardwareId: id, bothWays: false }] },
  });
  expect(changed.status(), await changed.text()).toBe(200);
}
