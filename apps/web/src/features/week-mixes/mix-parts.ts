import type { WeekMixReply } from '@hidewright/contract';

/** A stretch of the week's hours: desk time first, then each kind of work, then what is free. */
export interface WeekPart {
  /** the number of its work in the table; none for desk and free time */
  number: number | null;
  name: string;
  hours: number;
  look: string;
}

/** Neighbours must be told apart: a seam of card colour parts them, and each carries its number. */
const runLooks = ['bg-verdigris text-card', 'bg-verdigris-deep text-card'];

/** All desk time of the week: that of no order, and that of each order. */
export const deskHours = ({ kinds, hours }: WeekMixReply): number =>
  kinds.reduce((sum, kind) => sum + Number(kind.deskHours), Number(hours.deskFirst));

export function weekParts(mix: WeekMixReply): WeekPart[] {
  const { kinds, hours } = mix;
  const parts = [
    { number: null, name: 'desk time', hours: deskHours(mix), look: 'bg-slate text-card' },
    ...kinds.map((kind, at) => ({
      number: at + 1,
      name: kind.name,
      hours: Number(kind.benchHours),
      look: lookOf(kind.kind, at),
    })),
    {
      number: null,
      name: 'free',
      hours: Number(hours.free),
      look: 'border border-dashed border-edge text-ink-soft',
    },
  ];
  return parts.filter((part) => part.hours > 0);
}

export const lookOf = (kind: 'run' | 'large piece', at: number): string =>
  kind === 'run' ? (runLooks[at % 2] ?? '') : 'bg-russet text-card';
