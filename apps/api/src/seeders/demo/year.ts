import { addDays, addWorkdays, weekday } from '@hidewright/domain';

/** Something that happens at one instant of the demo's year. */
export interface Moment {
  at: Date;
  happens: () => Promise<void>;
}

/** The twelve months that end on a day: everything is told by how many days before its end it was. */
export class Year {
  readonly end: string;
  readonly #moments: Moment[] = [];

  constructor(end: string) {
    this.end = end;
  }

  /** The working day so many days before the end; a weekend's things happen on the Friday before. */
  day(daysBefore: number): string {
    const day = addDays(this.end, -daysBefore);
    const back = Math.max(0, weekday(day) - 5);
    return addDays(day, -back);
  }

  /** @param time of the day, as hours and minutes */
  plan(daysBefore: number, time: string, happens: () => Promise<void>): void {
    this.planOn(this.day(daysBefore), time, happens);
  }

  /** So many working days after a day that is told by how many days before the end it was. */
  planAfter(
    daysBefore: number,
    workdays: number,
    time: string,
    happens: () => Promise<void>,
  ): void {
    this.planOn(addWorkdays(this.day(daysBefore), workdays), time, happens);
  }

  planOn(day: string, time: string, happens: () => Promise<void>): void {
    // What would lie after the year's end does not happen.
    if (day > this.end) return;
    this.#moments.push({ at: new Date(`${day}T${time}:00.000Z`), happens });
  }

  /** In the order in which they happen; what happens at the same instant keeps the order of planning. */
  get moments(): readonly Moment[] {
    return [...this.#moments].sort((a, b) => a.at.getTime() - b.at.getTime());
  }
}
