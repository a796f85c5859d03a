import type { Element } from './read-elements.ts';

/** What style sheets in the drawing hide: '.class', '#id' or an element's name. */
export type HiddenBySheet = ReadonlySet<string>;

const hides = /(?:^|;)\s*(?:display\s*:\s*none|visibility\s*:\s*(?:hidden|collapse))\b/i;

/** Reads the simple rules of a drawing's style sheets that hide something. */
export function hiddenBySheets(root: Element): HiddenBySheet {
  const hidden = new Set<string>();
  const waiting = [root];
  for (let element = waiting.pop(); element; element = waiting.pop()) {
    if (element.name === 'style') addRules(element.text, hidden);
    waiting.push(...element.children);
  }
  return hidden;
}

function addRules(sheet: string, hidden: Set<string>): void {
  for (const rule of sheet.split('}')) {
    const [selectors = '', declarations = ''] = rule.split('{');
    if (!hides.test(declarations)) continue;
    for (const selector of selectors.split(',')) hidden.add(selector.trim());
  }
}

/** Whether an element, and all in it, is not to be seen. */
export function isHidden({ name, attributes }: Element, bySheet: HiddenBySheet): boolean {
  if (attributes.get('display') === 'none') return true;
  const visibility = attributes.get('visibility');
  if (visibility === 'hidden' || visibility === 'collapse') return true;
  if (hides.test(attributes.get('style') ?? '')) return true;
  if (bySheet.size === 0) return false;
  if (bySheet.has(name) || bySheet.has(`#${attributes.get('id') ?? ''}`)) return true;
  const classes = attributes.get('class')?.trim().split(/\s+/) ?? [];
  return classes.some((each) => bySheet.has(`.${each}`));
}
