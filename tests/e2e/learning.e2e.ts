import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { keyboardAlone } from '../support/hands.ts';
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

/** The address of a pattern that the demo has made several times. */
async function coasterAt(page: Page): Promise<string> {
  const read = await page.request.get(`${hidewright.url}/api/patterns?limit=200`);
  const { items } = (await read.json()) as { items: { id: number; name: string }[] };
  const coaster = items.find(({ name }) => name === 'Drinks coaster, round');
  return `${hidewright.url}/pattern-room/patterns/${coaster?.id}`;
}

walk('what the last runs say becomes the next estimate', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, await coasterAt(page));
  await page.getByRole('link', { name: 'Compare and use them' }).click();
  await page.getByRole('heading', { name: 'Together' }).waitFor();
  const leaveOut = page.getByRole('button', { name: /^Leave out/ });
  const runs = await leaveOut.count();
  expect(runs).toBeGreaterThan(1);
  await keyboardAlone.press(leaveOut.first());
  await page.getByRole('button', { name: /^Mix in again/ }).waitFor();
  await page.getByText(`${runs - 1 === 1 ? '1 run' : `${runs - 1} runs`}, weighed`).waitFor();
  await expectAccessible(page);
  await page.setViewportSize(phone);
  await expectAccessible(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Use these' }));
  await page.getByText(/goes by its last runs as version 2/).waitFor();
  await page.getByText('Version 2 says the same already.').waitFor();

  // One customer's runs alone, for that customer's quotes alone.
  const whose = page.getByLabel('Runs of');
  const theirs = await whose.locator('option').nth(1).innerText();
  const customer = theirs.replace(/, \d+ runs?$/, '');
  await whose.selectOption({ label: theirs });
  await keyboardAlone.press(page.getByRole('button', { name: /^Use/ }));
  await page.getByText(`Quotes for ${customer} go by their own runs from now on.`).waitFor();
  await page.getByText(/go by their own \d+ runs?, since/).waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
  await page.getByRole('button', { name: 'Go by the pattern again' }).click();
  await page.getByText(`Quotes for ${customer} go by the pattern again.`).waitFor();

  await page.getByRole('link', { name: /^J-/ }).first().click();
  await page.getByText('Why it differs, step by step').click();
  await page.getByText(/together cost/).waitFor();
  await page.getByRole('table', { name: 'Minutes by step' }).waitFor();
  await expectAccessible(page);
});

walk('a maker times a step with one thumb, and the owner uses it', async ({ page }) => {
  await signInAs(page, hidewright.url, 'maker');
  await page.setViewportSize(phone);
  const coaster = await coasterAt(page);
  await visit(page, `${coaster}/time`);
  await page.getByLabel('Step').selectOption({ label: '3 Cut' });
  await page.getByRole('button', { name: 'Start' }).click();
  const lap = page.getByRole('button', { name: 'Lap' });
  await page.waitForTimeout(400);
  await lap.click();
  await page.reload();
  await settled(page);
  await lap.click();
  await expectAccessible(page);
  await keyboardAlone.press(page.getByRole('button', { name: 'Stop' }));
  await page.getByText('Type readings instead').click();
  await page.getByLabel('Readings in seconds').fill('6.2 abc');
  await page.getByRole('button', { name: 'Add them' }).click();
  await page.getByText(/abc is no time in seconds/).waitFor();
  await page.getByLabel('Readings in seconds').fill('6.2 6,4');
  await page.getByRole('button', { name: 'Add them' }).click();
  for (let laps = 2; laps > 0; laps -= 1) {
    await page.getByRole('button', { name: /^Remove reading 1,/ }).click();
  }
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Keep these 2 readings' }).click();
  await page.getByRole('heading', { name: 'Kept readings' }).waitFor();
  await page.getByText('enough readings for ±5 %').waitFor();
  expect(await page.getByRole('button', { name: /^Use it/ }).count()).toBe(0);

  await page.context().clearCookies();
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${coaster}/time?step=3`);
  await page.getByText('6.3 s').first().waitFor();
  await page.getByLabel('Allowance for rest').fill('10');
  await page.getByText('6.93 s').waitFor();
  await keyboardAlone.press(page.getByRole('button', { name: 'Use it as this step’s seconds' }));
  await page.getByText(/^Cut: 6.93 s per piece in version/).waitFor();
  await page.getByLabel('From').selectOption({ label: 'what the tickets say' });
  await page.getByRole('heading', { name: 'From the tickets' }).waitFor();
  await expectAccessible(page);
});
