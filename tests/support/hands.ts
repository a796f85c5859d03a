import type { Locator } from 'playwright-core';

/** How somebody works a page: with mouse and keyboard, or with the keyboard alone. */
export interface Hands {
  name: string;
  press: (target: Locator) => Promise<void>;
  fill: (target: Locator, text: string) => Promise<void>;
  /** Picks an option of a list that opens, by its words. */
  choose: (list: Locator, label: string) => Promise<void>;
  check: (radio: Locator) => Promise<void>;
}

export const mouse: Hands = {
  name: 'mouse',
  press: (target) => target.click(),
  fill: (target, text) => target.fill(text),
  choose: async (list, label) => void (await list.selectOption({ label })),
  check: (radio) => radio.check(),
};

export const keyboardAlone: Hands = {
  name: 'keyboard',
  press: async (target) => {
    await reach(target);
    await target.page().keyboard.press('Enter');
  },
  fill: async (target, text) => {
    await reach(target);
    const { keyboard } = target.page();
    if ((await target.getAttribute('type')) === 'date') return keyboard.type(asTyped(text));
    await keyboard.press('Control+A');
    await keyboard.type(text);
  },
  choose: async (list, label) => {
    await reach(list);
    // A closed list goes to what begins like the letters typed; a space would open it.
    await list.page().keyboard.type(label.split(' ')[0] ?? label);
    const chosen = await list.locator('option:checked').innerText();
    if (chosen !== label) throw new Error(`Typing led to ${chosen}, not to ${label}.`);
  },
  check: async (radio) => {
    const group = radio.page().locator(`input[name="${await radio.getAttribute('name')}"]`);
    await reach(group);
    const { keyboard } = radio.page();
    for (let at = await group.count(); at > 0 && !(await radio.isChecked()); at -= 1) {
      await keyboard.press('ArrowDown');
    }
    if (!(await radio.isChecked())) throw new Error('The arrow keys do not lead to that choice.');
  },
};

/** More stops than any page has. */
const mostStops = 400;

/** Goes on by Tab until the focus stands on the target, or on one of a group. */
async function reach(target: Locator): Promise<void> {
  await target.first().waitFor();
  for (let stop = 0; stop < mostStops; stop += 1) {
    const there = await target.evaluateAll((all) =>
      all.some((each) => each === document.activeElement),
    );
    if (there) return;
    await target.page().keyboard.press('Tab');
  }
  throw new Error(`Tab never leads to ${String(target)}.`);
}

/** A day as the segments of a date field take it in English: month, day, year. */
function asTyped(day: string): string {
  const [year, month, date] = day.split('-');
  return `${month}${date}${year}`;
}
