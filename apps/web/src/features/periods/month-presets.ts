import { addDays } from '@hidewright/domain';

export interface Preset {
  word: string;
  from: string;
  to: string;
}

const months = new Intl.DateTimeFormat('en', { month: 'long', year: 'numeric', timeZone: 'UTC' });
const monthWord = (day: string) => months.format(new Date(`${day}T00:00:00Z`));
const firstOfMonth = (day: string) => `${day.slice(0, 7)}-01`;

/** The periods that are asked for most: this month and year so far, and the three months before. */
export function monthPresets(today: string): Preset[] {
  const thisMonth = firstOfMonth(today);
  const presets = [{ word: `${monthWord(today)}, so far`, from: thisMonth, to: today }];
  let after = thisMonth;
  for (let back = 0; back < 3; back += 1) {
    const to = addDays(after, -1);
    after = firstOfMonth(to);
    presets.push({ word: monthWord(to), from: after, to });
  }
  const year = today.slice(0, 4);
  return [...presets, { word: `${year}, so far`, from: `${year}-01-01`, to: today }];
}
