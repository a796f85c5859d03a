import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { axeFindings, selectorOf } from './axe.ts';
import { browser, still, watch, wide } from './browser.ts';
import { settled } from './steps.ts';

interface Walk {
  /** What the page has complained of; a test that provokes a complaint takes it out. */
  complaints: string[];
  page: Page;
}

/** A test with a page of its own, which fails when the page complained of anything. */
export const walk = test.extend<Walk>({
  complaints: async ({}, use) => use([]),
  page: async ({ complaints }, use) => {
    const context = await (await browser()).newContext({ ...still, viewport: wide });
    const page = await context.newPage();
    const heard = watch(page);
    await use(page);
    complaints.push(...heard);
    await context.close();
    expect(complaints, 'the page complained').toEqual([]);
  },
});

/** Fails with what axe finds against WCAG 2.2 AA on the page as it stands. */
export async function expectAccessible(page: Page): Promise<void> {
  const findings = (await axeFindings(page)).map(({ id, help, nodes }) => ({
    id,
    help,
    where: nodes.slice(0, 3).map(selectorOf),
  }));
  expect(findings, page.url()).toEqual([]);
}

/** Goes to a place inside the application and looks at it with axe. */
export async function visit(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await settled(page);
  await expectAccessible(page);
}

/** The id at the end of an address such as /counter/quotes/31. */
export function idIn(address: string): number {
  const id = Number(/\/(\d+)$/.exec(new URL(address).pathname)?.[1]);
  expect(id, address).toBeGreaterThan(0);
  return id;
}

/** The page is no wider than its window, once it has taken in the window's width. */
export async function expectNoOverflow(page: Page): Promise<void> {
  const tooWide = () =>
    page.evaluate(() => {
      const { scrollWidth, clientWidth } = document.documentElement;
      if (scrollWidth <= clientWidth) return [];
      const out = [...document.querySelectorAll('body *')].filter(
        (each) => each.getBoundingClientRect().right > clientWidth + 0.5,
      );
      return [
        `${scrollWidth} > ${clientWidth}`,
        ...out.slice(-3).map((each) => each.outerHTML.slice(0, 200)),
      ];
    });
  await expect.poll(tooWide, { timeout: 5000 }).toEqual([]);
}
