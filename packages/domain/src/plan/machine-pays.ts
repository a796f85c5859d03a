import { InvalidInput } from '../errors/domain-error.ts';
import { paybackYears } from '../money/payback.ts';
import { presentValue } from '../money/present-value.ts';
import { straightLine } from '../money/straight-line.ts';
import { type DecimalText, Exact, readDecimal, toPlaces, toText } from '../numbers/decimal-text.ts';

/** A press or a die that would save time, at a price. Money in major units. */
export interface Machine {
  /** above 0 */
  price: DecimalText;
  minutesSavedPerRun: DecimalText;
  runsPerMonth: DecimalText;
  /** what an hour that is saved is worth */
  hourWorth: DecimalText;
  upkeepPerYear: DecimalText;
  /** how long it will be used, whole years from 1 to 40 */
  years: number;
  /** a year's interest, per cent from 0 to 100 */
  interestPercent: DecimalText;
}

export interface MachinePays {
  minutesSavedPerMonth: DecimalText;
  /** what the hours saved are worth, before upkeep */
  savedPerMonth: DecimalText;
  upkeepPerMonth: DecimalText;
  /** after so many months the price has come back, upkeep paid, nothing discounted; null where it never does */
  paybackMonths: number | null;
  /** of everything that it saves and costs over its life, the price included, as worth today */
  presentValue: DecimalText;
  /** what of the price each year of its life takes, in equal parts */
  wornPerYear: DecimalText;
  /** the least runs a month, in tenths, with which it earns its price and the interest; null where none do */
  runsToPay: DecimalText | null;
}

/**
 * Whether a press or a die pays. Its price is spent today; what it saves, less its upkeep, comes at
 * the end of each year of its life. Runs to pay: price / Σ (1 + i)^−t, t = 1 … years, plus the upkeep,
 * over what a run a month saves in a year.
 * @throws InvalidInput naming the field, with what to enter
 */
export function machinePays(machine: Machine): MachinePays {
  const { price, minutes, runs, hour, upkeep, interest } = readMachine(machine);
  const minutesPerMonth = minutes.times(runs);
  // Twelve months of minutes are a fifth of their hours: no division that never ends.
  const savedPerYear = minutesPerMonth.times(hour).div(5);
  const perYear = toText(savedPerYear.minus(upkeep));
  const flows = [toText(price.neg()), ...Array<DecimalText>(machine.years).fill(perYear)];
  const years = paybackYears(flows);
  const rate = interest.div(100).toNumber();
  const savedByOneRun = minutes.times(hour).div(5);
  const needed = price.div(annuity(rate, machine.years)).plus(upkeep);
  return {
    minutesSavedPerMonth: toText(minutesPerMonth),
    savedPerMonth: toPlaces(savedPerYear.div(12), 2),
    upkeepPerMonth: toPlaces(upkeep.div(12), 2),
    paybackMonths: years === null ? null : new Exact(years).times(12).toDP(1).toNumber(),
    presentValue: presentValue(rate, flows),
    wornPerYear: straightLine({ price: toText(price), salvage: '0', years: machine.years }),
    runsToPay: savedByOneRun.isZero()
      ? null
      : toText(needed.div(savedByOneRun).toDP(1, Exact.ROUND_UP)),
  };
}

/** What 1 a year for so many years is worth today. */
function annuity(rate: number, years: number) {
  const growth = new Exact(rate).plus(1);
  let worth = new Exact(0);
  for (let year = 0; year < years; year += 1) worth = worth.plus(1).div(growth);
  return worth;
}

const sentences = {
  price: 'Enter what it costs, above 0, such as 480.00.',
  minutesSavedPerRun: 'Enter how many minutes it saves on one run, such as 25.',
  runsPerMonth: 'Enter how many runs a month would use it, such as 4 or 2.5.',
  hourWorth: 'Enter what an hour is worth, such as 22.00.',
  upkeepPerYear: 'Enter a year’s upkeep, such as 60.00, or 0 where there is none.',
  interestPercent: 'Enter the interest a year, from 0 to 100 %.',
};

function readMachine(machine: Machine) {
  const { years } = machine;
  const read = (field: keyof typeof sentences, limits: { min: number; max: number }) => {
    try {
      return readDecimal(machine[field].trim(), field, { ...limits, places: 4 });
    } catch {
      throw new InvalidInput(field, sentences[field]);
    }
  };
  const much = { min: 0, max: 1e9 };
  const price = read('price', { min: 0.01, max: 1e9 });
  const minutes = read('minutesSavedPerRun', much);
  const runs = read('runsPerMonth', { min: 0, max: 10_000 });
  const hour = read('hourWorth', much);
  const upkeep = read('upkeepPerYear', much);
  if (!Number.isInteger(years) || years < 1 || years > 40) {
    throw new InvalidInput('years', 'Enter how many whole years it will be used, from 1 to 40.');
  }
  const interest = read('interestPercent', { min: 0, max: 100 });
  return { price, minutes, runs, hour, upkeep, interest };
}
