import type { Decimal } from 'decimal.js';
import { NotWorkable } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal, toAtMost } from '../numbers/decimal-text.ts';
import { addDays, type Day, daysBetween } from './day.ts';
import { isWorkday } from './workdays.ts';

export interface BenchTime {
  /** first day that can be worked on */
  from: Day;
  /** bench minutes of a workday, all people together */
  minutesPerDay: DecimalText;
  /** minutes already promised, by day */
  booked: Readonly<Record<Day, DecimalText>>;
  daysOff?: readonly Day[];
}

export interface Booking {
  /** the day on which the last minute fits */
  day: Day;
  bookings: { day: Day; minutes: DecimalText }[];
}

const furthestDays = 3 * 366;

/**
 * Puts minutes into the first free bench time from a day on, and says on which day they are done.
 * @throws InvalidInput · NotWorkable where they do not fit within three years
 */
export function bookHours(time: BenchTime, minutes: DecimalText): Booking {
  let left = readDecimal(minutes, 'minutes', { min: 0 });
  const bookings: Booking['bookings'] = [];
  for (let at = 0; at < furthestDays; at += 1) {
    const day = addDays(time.from, at);
    const free = freeOn(time, day);
    if (left.isZero() && isWorkday(day, time.daysOff)) return { day, bookings };
    if (free.lte(0)) continue;
    const taken = left.lt(free) ? left : free;
    bookings.push({ day, minutes: toAtMost(taken, 4) });
    left = left.minus(taken);
    if (left.isZero()) return { day, bookings };
  }
  throw new NotWorkable(
    'That does not fit into the next three years: check the bench minutes of a day.',
  );
}

/** Free bench minutes from the first day up to and including a day. @throws InvalidInput */
export function freeMinutesUntil(time: BenchTime, until: Day): DecimalText {
  let sum: Decimal = new Exact(0);
  for (let at = 0; at <= daysBetween(time.from, until); at += 1) {
    sum = sum.plus(freeOn(time, addDays(time.from, at)));
  }
  return toAtMost(sum, 4);
}

function freeOn(time: BenchTime, day: Day): Decimal {
  if (!isWorkday(day, time.daysOff)) return new Exact(0);
  const all = readDecimal(time.minutesPerDay, 'minutesPerDay', { min: 0, max: 100_000 });
  const free = all.minus(readDecimal(time.booked[day] ?? '0', 'booked', { min: 0 }));
  return free.lt(0) ? new Exact(0) : free;
}
