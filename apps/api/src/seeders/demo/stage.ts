import type { DemoShop } from './demo-shop.ts';
import type { Furnished } from './furnish.ts';
import type { DemoRun, Fate } from './scenario/runs.ts';
import type { Year } from './year.ts';

/** One run while its part of the year is played. */
export interface Played {
  run: DemoRun;
  quoteId: number;
  orderId: number;
}

/** How far each fate goes; a fate includes all that comes before it. */
const course: Fate[] = [
  'draft',
  'sent',
  'agreed',
  'awaiting',
  'ready',
  'at the bench',
  'packed',
  'shipped',
  'invoiced',
  'part paid',
  'paid',
];

export const reaches = ({ fate }: DemoRun, stage: Fate) =>
  course.indexOf(fate) >= course.indexOf(stage);

export interface Stage {
  shop: DemoShop;
  year: Year;
  furnished: Furnished;
}
