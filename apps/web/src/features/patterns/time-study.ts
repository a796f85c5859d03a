import { studyTimes, usualPrecision } from '@hidewright/domain';
import { withPoint } from '../../lib/comma.ts';

/** A stopwatch that keeps its laps: seconds to the hundredth, as text. */
export interface Stopwatch {
  laps: string[];
  /** When the lap under way began; null while it stands. */
  lapFrom: number | null;
}

export const stoppedWatch: Stopwatch = { laps: [], lapFrom: null };

export const started = (watch: Stopwatch, now: number): Stopwatch => ({ ...watch, lapFrom: now });

/** What was not finished when it is stopped is no reading. */
export const stopped = (watch: Stopwatch): Stopwatch => ({ ...watch, lapFrom: null });

/** A second press within a tenth of a second is the same thumb. */
const shortest = 100;

export function lapped({ laps, lapFrom }: Stopwatch, now: number): Stopwatch {
  if (lapFrom === null || now - lapFrom < shortest) return { laps, lapFrom };
  return { laps: [...laps, hundredths(now - lapFrom)], lapFrom: now };
}

/** Seconds to the hundredth without superfluous zeros. */
const hundredths = (ms: number): string => String(Math.round(ms / 10) / 100);

export const withoutLap = (watch: Stopwatch, at: number): Stopwatch => ({
  ...watch,
  laps: watch.laps.filter((_, lap) => lap !== at),
});

/** What was typed as readings, or the part of it that is none. */
type Typed = { readings: string[] } | { wrong: string };

/** Reads "12.4 13 11,8": seconds with spaces, semicolons or line breaks between. */
export function readTyped(text: string): Typed {
  const parts = text.split(/,\s+|[\s;]+/).filter((part) => part !== '');
  const plain = parts.map((part) => withPoint(part));
  const wrong = plain.findIndex((part) => !isSeconds(part));
  if (wrong >= 0) return { wrong: parts[wrong] ?? '' };
  return { readings: plain.map((part) => String(Number(part))) };
}

const isSeconds = (text: string): boolean => /^\d{1,5}(\.\d{1,2})?$/.test(text) && Number(text) > 0;

export interface Study {
  mean: number;
  sd: number | null;
  count: number;
  /** How many readings are missing; null while the spread is not known. */
  missing: number | null;
}

/** Mean, spread and what is missing for ±5 % at 95 %; none without a reading. */
export function studyOf(readings: readonly string[]): Study | null {
  const sound = readings.map(Number).filter((seconds) => seconds > 0);
  if (sound.length === 0) return null;
  const { mean, sd, count, needed } = studyTimes(sound, usualPrecision);
  return { mean, sd, count, missing: needed === null ? null : Math.max(0, needed - count) };
}

/** "enough readings for ±5 %", "7 more for ±5 %" */
export function enoughWords({ missing }: Study): string {
  if (missing === null) return 'take a second one to see the spread';
  return missing === 0 ? 'enough readings for ±5 %' : `${missing} more for ±5 %`;
}
