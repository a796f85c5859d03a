import axe, { type NodeResult, type Result } from 'axe-core';
import type { Page } from 'playwright-core';

/** What axe finds against WCAG 2.2 AA, and against good practice, on the page as it stands. */
export async function axeFindings(page: Page): Promise<Result[]> {
  if (!(await page.evaluate(() => 'axe' in globalThis))) await page.evaluate(axe.source);
  return page.evaluate(async () => {
    const { axe: inPage } = globalThis as unknown as { axe: typeof axe };
    const { violations } = await inPage.run(document, { resultTypes: ['violations'] });
    return violations;
  });
}

/** The selectors of what one finding points at, those inside a frame or a shadow behind their hosts. */
export const selectorOf = (node: NodeResult): string => node.target.flat().join(' ');
