import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { browser, closeBrowser, phone, still, watch } from '../support/browser.ts';
import type { Hidewright } from '../support/hidewright.ts';
import { startDemo } from '../support/made-demo.ts';
import { settled, signInAs } from '../support/steps.ts';
import { expectAccessible, expectNoOverflow, visit } from '../support/walk.ts';

let hidewright: Hidewright;
beforeAll(async () => {
  hidewright = await startDemo();
});
afterAll(async () => {
  await closeBrowser();
  await hidewright.stop();
});

interface TicketLot {
  lotId: number;
  tag: string;
  takenAreaMm2: string;
  mix: { of: string } | null;
}
interface LastTime {
  lastTime: { lots: { lotId: number; tag: string }[] };
}
interface Drawing {
  version: number;
  outline: unknown;
  flaws: unknown;
  usablePercent: string;
}
interface Found {
  items: { id: number; state: string }[];
}

async function read<T>(page: Page, address: string): Promise<T> {
  return (await (await page.request.get(`${hidewright.url}/api${address}`)).json()) as T;
}

/** Photographs the lot that the run before was cut from; any picture will do. */
async function photographLastTime(page: Page, orderId: number): Promise<string> {
  const { lastTime } = await read<LastTime>(page, `/orders/${orderId}/last-time`);
  const { lotId, tag } = lastTime.lots[0] as { lotId: number; tag: string };
  const lot = `${hidewright.url}/api/lots/${lotId}`;
  const headers = { 'Content-Type': 'image/png' };
  const data = await page.screenshot();
  const { hash } = await (await page.request.post(`${lot}/photos`, { headers, data })).json();
  const { version, outline, flaws, usablePercent } = await read<Drawing>(
    page,
    `/lots/${lotId}/drawing`,
  );
  const kept = await page.request.put(`${lot}/drawing`, {
    headers: { 'If-Match': `"${version}"` },
    data: { outline, flaws, usablePercent, photo: { hash, mmPerPixel: 2, x: 0, y: 0 } },
  });
  expect(kept.status()).toBe(200);
  return tag;
}

test('a maker is warned of shades, puts an offcut back, and reads the chain', async () => {
  const context = await (await browser()).newContext({ ...still, viewport: phone });
  const page = await context.newPage();
  const complaints = watch(page);
  await signInAs(page, hidewright.url, 'maker');
  const jobs = (await read<Found>(page, '/jobs?open=true&limit=200')).items;
  const jobId = jobs.find(({ state }) => state === 'at the bench')?.id;
  const { lots, orderId } = await read<{ lots: TicketLot[]; orderId: number }>(
    page,
    `/jobs/${jobId}`,
  );
  const taken = lots.find(({ takenAreaMm2 }) => takenAreaMm2 !== '0');
  const lighter = lots.find(({ mix }) => mix?.of === 'shades');
  const earlier = await photographLastTime(page, orderId);
  await visit(page, `${hidewright.url}/bench/jobs/${jobId}`);
  await page.getByRole('heading', { name: 'The shade to match' }).waitFor();
  const swatch = page.getByRole('img', { name: `Lot ${earlier}` });
  await swatch.waitFor();
  await settled(page);
  const seen = await swatch.evaluate((image) => (image as HTMLImageElement).naturalWidth);
  expect(seen).toBe(phone.width);

  await page.getByRole('button', { name: 'Take another amount of leather' }).click();
  const taking = page.getByRole('dialog', { name: 'Take leather' });
  expect(await taking.getByText('Shades would mix').count()).toBe(0);
  await taking.getByLabel('Lot', { exact: true }).selectOption(String(lighter?.lotId));
  await taking.getByText(`Shades would mix: ${lighter?.tag} is`).waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  await taking.getByLabel('How much').fill('2');
  await taking.getByRole('button', { name: 'Take it' }).click();
  await page.getByText('Taken from the rack.').first().waitFor();

  await page.getByRole('button', { name: `Put an offcut back of lot ${lighter?.tag}` }).click();
  const offcut = page.getByRole('dialog', { name: `Offcut of lot ${lighter?.tag}` });
  await offcut.getByRole('button', { name: 'Put it back' }).click();
  await offcut.getByText('Enter its width and height, or its area.').first().waitFor();
  await offcut.getByLabel('Width').fill('900');
  await offcut.getByLabel('Height').fill('900');
  await offcut.getByRole('button', { name: 'Put it back' }).click();
  await offcut
    .getByText(/^This job has 2 ft² of lot .* Measure it again\.$/)
    .first()
    .waitFor();
  await expectAccessible(page);
  await offcut.getByLabel('Width').fill('300');
  await offcut.getByLabel('Height').fill('250');
  await offcut.getByLabel('Place').fill('offcut bin');
  await offcut.getByRole('button', { name: 'Put it back' }).click();
  const told = await offcut.getByText(/^Write T-\d+ on it/).innerText();
  const tag = /T-\d+/.exec(told)?.[0] ?? '';
  await expectAccessible(page);
  await offcut.getByRole('button', { name: 'Done' }).click();
  await page.getByText(`${tag} offcut 300 × 250 mm`).waitFor();

  const cut = page.getByRole('list', { name: 'Cut from' });
  await cut.getByRole('link', { name: lighter?.tag ?? '' }).waitFor();
  await cut.getByRole('link', { name: taken?.tag ?? '' }).waitFor();
  await cut.getByRole('link', { name: lighter?.tag ?? '' }).click();
  await page.getByRole('heading', { name: 'From the side to the customer' }).waitFor();
  await settled(page);
  await page.getByText('for The Copper Heron').first().waitFor();
  const family = page.getByRole('list', { name: 'Cut from one another' });
  await family.getByRole('link', { name: tag }).click();
  await page.getByText('this lot, offcut, a shade lighter, offcut bin').waitFor();
  await page.getByText('Nothing yet.').waitFor();
  expect(await page.locator('main').innerText()).not.toMatch(/cost|@/i);
  await expectAccessible(page);
  await expectNoOverflow(page);
  await page.getByRole('link', { name: 'In the ledger' }).click();
  const only = page.getByText(`Only lot ${tag}`);
  await only.waitFor();
  await page.getByLabel('What', { exact: true }).selectOption('return');
  await page.getByRole('button', { name: 'Show', exact: true }).click();
  await page.waitForURL(/lot=\d+.*kind=return/);
  await only.waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  await page.getByRole('link', { name: `Show everything, not only lot ${tag}` }).click();
  await page.waitForURL(/ledger\?kind=return$/);
  await only.waitFor({ state: 'detached' });
  await context.close();
  // The browser itself says that an offcut larger than what was taken is refused.
  expect(complaints.filter((said) => !/status of 422/.test(said))).toEqual([]);
});
