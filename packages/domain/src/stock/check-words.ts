import type { Decimal } from 'decimal.js';
import { Exact, toAtMost } from '../numbers/decimal-text.ts';
import { countWords } from '../numbers/count-words.ts';
import { countedWords } from '../hardware/units.ts';
import type { Day } from '../promise/day.ts';
import type { ItemFacts, Standing } from './check-items.ts';
import type { LeatherFacts, LotTaken } from './check-leather.ts';
import type { HoursFacts } from './check-runs.ts';
import type { Sourcing } from './check-stock.ts';
import type { ToolFacts } from './check-tools.ts';
import { amountToBuy, leatherToBuy, packsOf, type ToBuy } from './what-to-buy.ts';
import { wholes } from './wholes.ts';

/** How the shop says areas and days. */
export interface Say {
  area: (areaMm2: Decimal) => string;
  day: (day: Day) => string;
}

const mm2 = (thousandths: number): Decimal => new Exact(thousandths).div(1000);

/** What to take, or what is short and what mends it; a sentence or more, for the maker: never a price. */
export function hardwareWords({ item, ...standing }: ItemFacts, say: Say): string {
  const { needed, now, free, short } = standing;
  const pieces = countedIn(item);
  if (item.fromCustomer) return customerWords({ item, ...standing }, say);
  const losses = lossWords({ item, ...standing });
  if (short === 0) {
    const take =
      now === needed
        ? `${item.name}: take ${pieces(needed)} of ${pieces(free)} free.`
        : `${item.name}: ${pieces(now)} of ${pieces(needed)} are free now. The rest ${comes(standing, say)}, in time.`;
    return [take, ...losses].join(' ');
  }
  const head = `${item.name}: ${pieces(needed)} needed, ${pieces(free)} free, ${pieces(short)} short.`;
  const missing = standing.buy - standing.drafted;
  return [
    head,
    ...losses,
    ...othersWords(standing.forOthers, pieces),
    ...remedy(standing, item.buying, missing > 0 ? buyWords(item, missing) : null, say),
    ...standInWords({ item, ...standing }),
  ].join(' ');
}

/** "36 of the 236 are for losses." */
function lossWords({ item, needed, forLosses }: ItemFacts): string[] {
  if (forLosses === 0) return [];
  const are = forLosses === 1 ? 'is' : 'are';
  return [`${countedIn(item)(forLosses)} of the ${countWords(needed)} ${are} for losses.`];
}

/** Why more is to be bought than is short. */
const othersWords = (forOthers: number, say: (quantity: number) => string): string[] =>
  forOthers === 0 ? [] : [`${say(forOthers)} more are lacking for what was promised before.`];

const countedIn =
  ({ unit = 'piece' }: ItemFacts['item']) =>
  (count: number | string) =>
    countedWords(count, unit);

function buyWords(item: ItemFacts['item'], missing: number): string {
  const { terms } = item.buying;
  const toBuy = amountToBuy(terms, String(missing));
  const [count, size] = [packsOf(terms, toBuy.quantity), Number(terms.multiple)];
  const amount =
    count === null ? countedIn(item)(toBuy.quantity) : packs(count, countedIn(item)(size));
  return `Buy ${amount}${breakWords(toBuy)}, or receive them if they are here.`;
}

/** Why it is more than is short; never what it costs. */
const breakWords = ({ quantity, plain }: ToBuy): string =>
  quantity === plain ? '' : ' (the price breaks there)';

/** Of what the customer brings, nothing is bought: they are asked for it. */
function customerWords({ item, ...standing }: ItemFacts, say: Say): string {
  const { needed, now, short } = standing;
  const counted = countedIn(item);
  const head = `${item.name}, from the customer:`;
  const losses = lossWords({ item, ...standing });
  if (short === 0) {
    const here =
      now === needed
        ? `${head} ${counted(needed)} of theirs are here.`
        : `${head} ${counted(now)} of ${counted(needed)} are here. The rest ${comes(standing, say)}, in time.`;
    return [here, ...losses].join(' ');
  }
  const missing = `${head} ${counted(needed)} needed, ${counted(now)} here, ${counted(short)} missing.`;
  const ask = `Ask the customer for ${short === 1 ? 'it' : 'them'}, and receive ${short === 1 ? 'it' : 'them'} here.`;
  return [missing, ...losses, ask, ...standInWords({ item, ...standing })].join(' ');
}

/** "12 Brass ring 16 mm can stand in for 12 of the 20 that are short." */
function standInWords({ couldStandIn, short }: ItemFacts): string[] {
  if (couldStandIn.length === 0) return [];
  const total = couldStandIn.reduce((sum, { quantity }) => sum + quantity, 0);
  const what = couldStandIn.map(({ name, quantity }) => `${countWords(quantity)} of ${name}`);
  const all = short === 1 ? 'the 1 that is short' : `the ${countWords(short)} that are short`;
  const forWhat = total < short ? `${countWords(total)} of ${all}` : all;
  return [`${what.join(' and ')} can stand in for ${forWhat}, if you choose so.`];
}

const packs = (count: number, size: string): string =>
  `${countWords(count)} ${count === 1 ? 'pack' : 'packs'} of ${size}`;

/** @see hardwareWords */
export function leatherWords(facts: LeatherFacts, say: Say): string {
  const { leather, takes, standing, piecesShort } = facts;
  const area = (thousandths: number) => say.area(mm2(thousandths));
  const shades = shadeWords(facts);
  const from = takes.map((take) => `${area(take.area)} from ${take.lot.tag}`).join(', ');
  if (piecesShort === 0) {
    const rest =
      facts.piecesComing === 0
        ? []
        : [`${from === '' ? 'It' : 'The rest'} ${comes(standing, say)}, in time.`];
    const take = from === '' ? [] : [`take ${from}.`];
    return `${leather.name}: ${[...take, ...rest, ...shades].join(' ')}`;
  }
  const { needed, free, short } = standing;
  const head = `${leather.name}: ${area(needed)} needed, ${area(free)} free in whole panels, ${area(short)} short.`;
  const missing = standing.buy - standing.drafted;
  const buy = missing > 0 ? buyLeatherWords(leather, missing, say) : null;
  const small = smallWords(facts);
  const others = othersWords(standing.forOthers, area);
  return [head, ...small, ...others, ...remedy(standing, leather.buying, buy, say), ...shades].join(
    ' ',
  );
}

/** Why leather that hangs there is not counted as free. */
const smallWords = ({ tooSmall, tooLittle }: LeatherFacts): string[] => [
  ...lotsWords('Too small for its panels', tooSmall),
  ...lotsWords('Too little left for a panel', tooLittle),
];

/** "Too small for its panels: T-0002, T-0003, T-0004 and 2 more." */
function lotsWords(why: string, tags: readonly string[]): string[] {
  if (tags.length === 0) return [];
  const others = tags.length - 3;
  const more = others > 0 ? ` and ${countWords(others)} more` : '';
  return [`${why}: ${tags.slice(0, 3).join(', ')}${more}.`];
}

function buyLeatherWords(leather: LeatherFacts['leather'], missing: number, say: Say): string {
  const toBuy = leatherToBuy(leather, missing);
  const amount =
    toBuy.whole === null
      ? `about ${say.area(new Exact(toBuy.quantity))} more`
      : `${toBuy.whole.count} more ${wholes(toBuy.whole)}`;
  const here = (toBuy.whole?.count ?? 1) > 1 ? 'them if they are' : 'it if it is';
  return `Buy ${amount}${breakWords(toBuy)}, or receive ${here} here.`;
}

function shadeWords({ shades, likeShade, takes }: LeatherFacts): string[] {
  const noted = shades.filter(Boolean);
  if (noted.length > 1)
    return [`Shades would mix: ${noted.join(' and ')}. Show the customer both, or wait for one.`];
  if (takes.length > 1 && shades.includes('')) {
    return [
      `Lay ${takes.map(({ lot }) => lot.tag).join(' and ')} side by side first: not every shade is noted.`,
    ];
  }
  const [shade] = noted;
  return likeShade && shade !== likeShade && takes.length > 0
    ? [`The earlier run’s leather is ${likeShade}${shade ? `, this would be ${shade}` : ''}.`]
    : [];
}

/** "comes with P-0007 by Tue 8 Dec 2026" */
function comes({ coming, enoughOn }: Standing, say: Say): string {
  const papers = [...new Set(coming.flatMap(({ paper }) => paper ?? []))];
  const withPaper = papers.length === 0 ? '' : ` with ${papers.join(' and ')}`;
  return `comes${withPaper}${enoughOn === null ? '' : ` by ${say.day(enoughOn)}`}`;
}

function remedy(standing: Standing, buying: Sourcing, buy: string | null, say: Say): string[] {
  const { enoughOn } = standing;
  const late = lateWords(buying);
  if (standing.buy === 0) return [`The rest ${comes(standing, say)}.`, ...late];
  const drafted =
    standing.drafted > 0
      ? [
          `${buying.drafts.join(' and ')} is drafted for ${buy === null ? 'it' : 'a part of it'} and still to be sent.`,
        ]
      : [];
  const when =
    buying.supplier === null || enoughOn === null
      ? ['Say who sells it, and the day can be told.']
      : [`Ordered from ${buying.supplier} today, it is here by ${say.day(enoughOn)}.`];
  return [...drafted, ...(buy === null ? [] : [buy]), ...when, ...late];
}

const lateWords = ({ overdue = [] }: Sourcing): string[] =>
  overdue.length === 0
    ? []
    : [`${overdue.join(' and ')} should have brought some by now: ask when it comes.`];

/** What a lot is gone to for: "6 panels for 54 pieces, by its usable share; 4 more fit". */
export function lotWords({ by, units, pieces, unitsLeft }: LotTaken): string {
  const more =
    unitsLeft === 0
      ? 'no more fit'
      : `${countWords(unitsLeft)} more ${unitsLeft === 1 ? 'fits' : 'fit'}`;
  if (by === 'layout') return `${countWords(pieces)} pieces by its layout; ${more}`;
  const how = by === 'area' ? ', by its usable share' : '';
  const panels = `${countWords(units)} ${units === 1 ? 'panel' : 'panels'}`;
  return `${panels} for ${countWords(pieces)} pieces${how}; ${more}`;
}

export function toolWords({ need, tool, ok, strikesNeeded, strikesLeft }: ToolFacts): string {
  if (tool === null) return `${need.word}: not in the shop yet. ${need.otherwise}`;
  if (ok) return `${tool.name}: ready, ${countWords(strikesLeft)} strikes left in it.`;
  return `${tool.name}: ${countWords(strikesNeeded)} strikes needed, ${countWords(strikesLeft)} left in it: order a new one.`;
}

export function hoursWords(facts: HoursFacts, say: Say): string {
  const { by, needed, free, ok, waits } = facts;
  const day = say.day(by);
  const laid = waits ? ', the waits between steps kept' : '';
  if (ok) return `Bench hours: ${hours(needed)} of the ${hours(free)} free by ${day}${laid}.`;
  if (needed > free) {
    return `Bench hours: ${hours(needed)} needed by ${day}, ${hours(free)} free, ${hours(needed - free)} short. ${sooner(facts, say)}`;
  }
  return `Bench hours: ${hours(needed)} of the ${hours(free)} free by ${day}, but its pieces must lie between steps. ${sooner(facts, say)}`;
}

function sooner({ earliest }: HoursFacts, say: Say): string {
  return earliest === null
    ? 'The bench has no such hours within a year: set its hours per day in the Office.'
    : `Promise ${say.day(earliest)} or later, or move another job.`;
}

const hours = (hundredths: number): string => toAtMost(new Exact(hundredths).div(6000), 1);
