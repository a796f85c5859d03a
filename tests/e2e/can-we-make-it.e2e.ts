import { afterAll, beforeAll, expect } from 'vitest';
import { closeBrowser, phone } from '../support/browser.ts';
import { daysFromNow, saidFromNow } from '../support/days.ts';
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

walk(
  'the maker checks two runs on a phone, and sees what is short and by when it can be mended',
  async ({ page }) => {
    await page.setViewportSize(phone);
    await signInAs(page, hidewright.url, 'maker');
    await visit(page, `${hidewright.url}/bench`);
    await page.getByRole('link', { name: 'Can we make it?', exact: true }).click();
    await settled(page);
    await expectAccessible(page);

    await page.getByLabel('Pattern of run 1').selectOption({ label: 'Luggage tag with neck' });
    await keyboardAlone.fill(page.getByLabel('How many'), '0');
    await keyboardAlone.press(page.getByRole('button', { name: 'Can we make them?' }));
    await page
      .locator('form')
      .getByText(/^Enter 1 or more pieces/)
      .first()
      .waitFor();

    await page.getByLabel('How many').fill('400');
    await page.getByLabel('Packed by').fill(daysFromNow(9));
    await page.getByRole('button', { name: 'So many of a pattern' }).click();
    await page.getByLabel('Pattern of run 2').selectOption({ label: 'Luggage tag with neck' });
    await page.getByLabel('How many').nth(1).fill('600');
    await page.getByLabel('Packed by').nth(1).fill(daysFromNow(20));
    await page.getByRole('button', { name: 'Can we make them?' }).click();
    await page.getByRole('heading', { name: '2. Luggage tag with neck' }).waitFor();
    await page.getByRole('heading', { name: 'What is short' }).waitFor();

    const rivets = page.getByRole('region', { name: 'Rivets 7 mm, antique brass' }).first();
    await rivets.getByText('Fennbridge Fittings').waitFor();
    await rivets.getByText(saidFromNow(3)).first().waitFor();
    await page
      .getByText(/of the [\d,]+ are for losses\./)
      .first()
      .waitFor();
    await page
      .getByText(/no spares of Buckles 20 mm, solid brass are counted/)
      .first()
      .waitFor();
    await rivets.getByText('Day by day').click();
    await rivets.getByRole('table').waitFor();
    await page
      .getByText(/Ordered from Oldbeck Tannery today, it is here by/)
      .first()
      .waitFor();
    await expectAccessible(page);
    await expectNoOverflow(page);
    const words = await page.locator('main').innerText();
    expect(words).not.toMatch(/\b(price|cost|USD)\b|\$/i);
    expect(await page.getByRole('button', { name: /Draft the purchase/ }).count()).toBe(0);
  },
);

walk('the owner drafts what is short with one press, and not twice', async ({ page }) => {
  await signInAs(page, hidewright.url, 'owner');
  await visit(page, `${hidewright.url}/bench/checks`);
  await page.getByLabel('Pattern of run 1').selectOption({ label: 'Luggage tag with neck' });
  await page.getByLabel('Option').waitFor();
  await page.getByLabel('How many').fill('900');
  await page.getByLabel('Packed by').fill(daysFromNow(20));
  await page.getByRole('button', { name: 'Can we make them?' }).click();
  await page.getByRole('heading', { name: 'What is short' }).waitFor();
  await expectAccessible(page);

  await keyboardAlone.press(page.getByRole('button', { name: 'Draft the purchase orders' }));
  await page.getByText('Drafted, not sent yet:').waitFor();
  await page
    .getByText(/is drafted for it and still to be sent\./)
    .first()
    .waitFor();
  await page
    .getByRole('button', { name: 'Draft the purchase orders' })
    .waitFor({ state: 'detached' });
  await expectAccessible(page);

  await page.goto(`${hidewright.url}/stockroom/purchase-orders`);
  await settled(page);
  expect(await page.getByText('draft', { exact: true }).count()).toBeGreaterThan(0);
});
