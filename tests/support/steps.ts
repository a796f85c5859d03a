import { expect } from 'vitest';
import type { Page } from 'playwright-core';
import { expectAccessible } from './browser.ts';

export type Role = 'owner' | 'maker' | 'bookkeeper';

/** Signs in at the demo's front door by the button of that person, and lands on Today. */
export async function signInAs(page: Page, url: string, role: Role): Promise<void> {
  await page.goto(`${url}/sign-in`);
  await page.getByRole('button', { name: new RegExp(`, ${role}`) }).click();
  await page.waitForURL('**/today');
  await settled(page);
}

/** Goes to a place inside the application and looks at it with axe. */
export async function visit(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await settled(page);
  await expectAccessible(page);
}

/** Everything that the page asked for has come, and a screen with a heading stands there. */
export async function settled(page: Page): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.getByRole('heading', { level: 1 }).first().waitFor();
}

/** The id at the end of an address such as /counter/quotes/31. */
export function idIn(address: string): number {
  const id = Number(/\/(\d+)$/.exec(new URL(address).pathname)?.[1]);
  expect(id, address).toBeGreaterThan(0);
  return id;
}
