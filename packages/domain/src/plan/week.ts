import type { DecimalText } from '../numbers/decimal-text.ts';

/** A kind of work that a week can hold: a run of one pattern, or one large piece. Money in major units. */
export interface KindOfWork {
  name: string;
  kind: 'run' | 'large piece';
  /** of one run or one piece, above 0 */
  benchMinutes: DecimalText;
  /** mail, files, packing and selling of its order */
  deskMinutes: DecimalText;
  /** of its price after everything bought, before wages; below 0 where it loses */
  left: DecimalText;
  /** what can be sold in a week; null: any number */
  mostPerWeek: DecimalText | null;
  /** what is promised */
  leastPerWeek: DecimalText;
}

export interface Week {
  /** all hands together, desk time included */
  hoursPerWeek: DecimalText;
  /** desk time that belongs to no order: it comes off first */
  deskHoursPerWeek: DecimalText;
  /** what must be left in the week, before wages */
  incomeNeeded: DecimalText;
  kinds: KindOfWork[];
}

export interface WeekMix {
  /** in the order of the input */
  kinds: MixedKind[];
  hours: WeekHours;
  /** of all that is made and sold in the week, before wages */
  left: DecimalText;
  /** left by all hours that are used, desk time included; null where none are */
  averagePerHour: DecimalText | null;
  /** what the week would leave more with one hour more, and the work that it would go into */
  oneMoreHour: { left: DecimalText; into: string[] };
  income: WeekIncome;
  largePieces: {
    /** hours of the mix for large pieces, desk time included */
    hours: DecimalText;
    /** hours that can go to them while the income needed is still reached; null where it is not */
    atMost: DecimalText | null;
  };
}

export interface MixedKind {
  name: string;
  kind: KindOfWork['kind'];
  /** up to 2 places: over the weeks it comes to whole ones */
  units: DecimalText;
  benchHours: DecimalText;
  deskHours: DecimalText;
  left: DecimalText;
  /** of one unit, by its bench and desk hours */
  leftPerHour: DecimalText;
  /** as many as can be sold; as few as are promised */
  at: 'most' | 'least' | null;
}

export interface WeekHours {
  all: DecimalText;
  /** desk time of no order, taken off first */
  deskFirst: DecimalText;
  free: DecimalText;
}

export interface WeekIncome {
  needed: DecimalText;
  reached: boolean;
  /** money that is missing; 0.00 where it is reached */
  short: DecimalText;
  /** hours a week that would have to be added to reach it; null where no hours would do, or none are needed */
  hoursShort: DecimalText | null;
}
