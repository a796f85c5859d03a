import type { Page } from 'playwright-core';

export type Role = 'owner' | 'maker' | 'bookkeeper';

/** Signs in at the demo's front door by the button of that person, and lands on Today. */
export async function signInAs(page: Page, url: string, role: Role): Promise<void> {
  await page.goto(`${url}/sign-in`);
  await page.getByRole('button', { name: new RegExp(`, ${role}`) }).click();
  await page.waitForURL('**/today');
  await settled(page);
}

/** Everything that the page asked for has come, and a screen with a heading stands there. */
export async function settled(page: Page): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.getByRole('heading', { level: 1 }).first().waitFor();
}

/** Fills in the first-run page of an empty shop, and lands on Today. */
export async function openShop(page: Page, name: string): Promise<void> {
  await page.getByLabel('Name of the shop').fill(name);
  await page.getByLabel('Your name').fill('Somebody New');
  await page.getByLabel('E-mail address').fill('new@example.com');
  await page.getByLabel('Password').fill('five plain words in a row');
  await page.getByRole('button', { name: 'Open the shop' }).click();
  await page.waitForURL('**/today');
  await settled(page);
}
