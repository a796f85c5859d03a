import { expect } from 'vitest';
import type { Page } from 'playwright-core';
import { browser, still, watch, type phone } from './browser.ts';
import { signInAs } from './steps.ts';

/** A browser of its own in which a role is signed in, and what its page complains of. */
export async function signedIn(
  url: string,
  role: Parameters<typeof signInAs>[2],
  viewport: typeof phone,
): Promise<{ page: Page; complaints: string[]; close: () => Promise<void> }> {
  const context = await (await browser()).newContext({ ...still, viewport });
  const page = await context.newPage();
  const complaints = watch(page);
  await signInAs(page, url, role);
  return { page, complaints, close: () => context.close() };
}

/** What the API says to whoever is signed in on the page, as `/api/…` of where the page is. */
export async function readApi<Reply>(page: Page, path: string): Promise<Reply> {
  const reply = await page.request.get(new URL(`/api/${path}`, page.url()).href);
  expect(reply.status(), path).toBe(200);
  return (await reply.json()) as Reply;
}
