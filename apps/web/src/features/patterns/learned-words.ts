import type { Learned, LearnedStep, PastRun } from '@hidewright/contract';
import { countText, minutesText, numberText, percentText } from '../../lib/formatting.ts';

/** A figure that can be taken into the pattern. */
export interface Offered {
  what: 'minutes' | 'rejects' | 'leather' | 'hardware';
  step: number | null;
  hardwareId: number | null;
  /** "Stamp, time" */
  name: string;
  now: string;
  found: string;
  /** The spread and what stands behind it. */
  behind: string;
  changes: boolean;
}

/** What the runs offer to the pattern, in the order of its work; what no run logged is not among it. */
export function offeredBy(learned: Learned): Offered[] {
  const work = learned.by === 'steps' ? learned.steps.flatMap(offeredByStep) : oneFigure(learned);
  return [
    ...work.map((each) => ({ ...each, hardwareId: null })),
    ...leatherOffered(learned.leather),
    ...learned.hardware.flatMap(hardwareOffered),
  ];
}

function leatherOffered({ saidExtraPercent, extra }: Learned['leather']): Offered[] {
  if (extra === null) return [];
  const { extraPercent, leastPercent, mostPercent, runs } = extra;
  const words = (percent: string) =>
    Number(percent) === 0 ? 'as the layout' : `layout and ${percentText(percent, 2)}`;
  return [
    {
      ...{ what: 'leather' as const, step: null, hardwareId: null, name: 'Leather' },
      now: words(saidExtraPercent),
      found: words(extraPercent),
      behind:
        leastPercent === mostPercent
          ? `${runsWord(runs)}, ${besideLayout(leastPercent)}`
          : `${runsWord(runs)}, from ${besideLayout(leastPercent)} to ${besideLayout(mostPercent)}`,
      changes: Number(extraPercent) !== Number(saidExtraPercent),
    },
  ];
}

function besideLayout(percent: string): string {
  const value = Number(percent);
  if (value === 0) return 'as the layout';
  return `${percentText(String(Math.abs(value)))} ${value < 0 ? 'less' : 'more'}`;
}

function hardwareOffered({
  hardwareId,
  name,
  saidLossPercent,
  losses,
}: Learned['hardware'][number]): Offered[] {
  if (losses === null) return [];
  return [
    {
      ...{ what: 'hardware' as const, step: null, hardwareId, name: `${name}: lost` },
      now: percentText(saidLossPercent, 2),
      found: percentText(losses.percent, 2),
      behind: `${countText(losses.taken)} taken for ${countText(losses.needed)} in ${runsWord(losses.runs)}`,
      changes: Number(losses.percent) !== Number(saidLossPercent),
    },
  ];
}

function oneFigure({ minutes, rejects }: Learned): Omit<Offered, 'hardwareId'>[] {
  return [
    ...(minutes.found === null
      ? []
      : [
          {
            ...{ what: 'minutes' as const, step: null, name: 'Minutes per 100' },
            now: `${numberText(minutes.said ?? '0', 2)} min`,
            found: `${numberText(minutes.found.per100, 2)} min`,
            behind: minutesBehind(minutes.found),
            changes: minutes.found.per100 !== minutes.said,
          },
        ]),
    ...(rejects.found === null
      ? []
      : [{ ...rejectsOffered(rejects.said, rejects.found), step: null, name: 'Rejects' }]),
  ];
}

function offeredByStep({
  position: step,
  name,
  per,
  said,
  time,
  rejects,
}: LearnedStep): Omit<Offered, 'hardwareId'>[] {
  return [
    ...(time === null ? [] : [{ ...timeOffered(said, time, per), step, name: `${name}: time` }]),
    ...(rejects === null
      ? []
      : [{ ...rejectsOffered(said.rejectPercent, rejects), step, name: `${name}: rejects` }]),
  ];
}

/** The setup is said only where it changes too. */
function timeOffered(
  said: LearnedStep['said'],
  time: NonNullable<LearnedStep['time']>,
  per: LearnedStep['per'],
) {
  const sameSetup = Number(time.setupMinutes) === Number(said.setupMinutes);
  const words = ({ setupMinutes, secondsPerUnit }: typeof said | typeof time) =>
    `${numberText(secondsPerUnit, 2)} s${sameSetup ? '' : `, setup ${minutesText(setupMinutes)}`}`;
  return {
    what: 'minutes' as const,
    now: words(said),
    found: sameSetup ? `${words(time)} per ${per}` : words(time),
    behind: `${countText(time.units)} ${unitWord(per, time.units)} in ${runsWord(time.runs)}${sameSetup ? `, setup stays at ${minutesText(said.setupMinutes)}` : ''}`,
    changes: !sameSetup || Number(time.secondsPerUnit) !== Number(said.secondsPerUnit),
  };
}

type Found = NonNullable<Learned['rejects']['found']>;

function rejectsOffered(said: string, found: Found) {
  return {
    what: 'rejects' as const,
    now: percentText(said, 2),
    found: percentText(found.percent, 2),
    behind: rejectsBehind(found),
    changes: Number(found.percent) !== Number(said),
  };
}

/** "11 of 112; likely 5.6 to 16.7 %" */
export function rejectsBehind({ rejected, reached, lowPercent, highPercent }: Found): string {
  return `${countText(rejected)} of ${countText(reached)}; likely ${numberText(lowPercent, 1)} to ${percentText(highPercent)}`;
}

/** "112 pieces in 2 runs, give or take 13.9 min" */
export function minutesBehind({
  sd,
  pieces,
  runs,
}: NonNullable<Learned['minutes']['found']>): string {
  const spread = sd === null ? '' : `, give or take ${numberText(sd, 1)} min`;
  return `${countText(pieces)} pieces in ${runsWord(runs)}${spread}`;
}

export const runsWord = (runs: number): string => (runs === 1 ? '1 run' : `${runs} runs`);

const unitWord = (per: string, units: number): string => (units === 1 ? per : `${per}s`);

/** The steps that keep their values, since no run logged them. */
export function notLogged(learned: Learned): string[] {
  return learned.steps.filter(({ time }) => time === null).map(({ name }) => name);
}

export const unusualWords: Record<NonNullable<PastRun['unusual']>, string> = {
  slow: 'looks unusual: slow',
  quick: 'looks unusual: quick',
  'many rejects': 'looks unusual: many rejects',
};
