import type {
  BodyOf,
  Learned,
  RunEstimate,
  takeLearned as takeLearnedEndpoint,
} from '@hidewright/contract';
import { invalid, type FieldFault } from '../../http/problem.ts';

export type Taken = BodyOf<typeof takeLearnedEndpoint>['take'][number];

/**
 * What is taken of what runs say. When all rejects are taken, the pieces behind them are kept for the cut count; when
 * only some are, none stand behind the rest.
 * @throws {Problem} 422 when there is nothing to take
 */
export function estimateFrom(learned: Learned, take: readonly Taken[]): RunEstimate {
  const faults = take.flatMap((taken, at) => faultsOf(taken, at, learned));
  if (faults.length > 0) throw invalid(faults);
  const history = historyAfter(learned, take);
  return {
    ...(learned.by === 'minutesPer100'
      ? oneFigure(learned, take)
      : { steps: steps(learned, take) }),
    ...(take.some(({ what }) => what === 'leather') && {
      leatherExtraPercent: learned.leather.extra?.extraPercent ?? '0',
    }),
    hardware: learned.hardware.flatMap(({ hardwareId, losses }) =>
      losses !== null && take.some((taken) => taken.hardwareId === hardwareId)
        ? [{ hardwareId, lossPercent: losses.percent }]
        : [],
    ),
    ...(history !== undefined && { history }),
  };
}

/** What the runs say of a figure; null where they say nothing. */
function foundFor({ what, step, hardwareId }: Taken, learned: Learned) {
  if (what === 'leather') return learned.leather.extra;
  if (what === 'hardware')
    return learned.hardware.find((each) => each.hardwareId === hardwareId)?.losses ?? null;
  const of = step === null ? learned : learned.steps[step - 1];
  if (of === undefined) return null;
  if (what === 'rejects') return 'said' in of ? of.rejects : of.rejects.found;
  return 'said' in of ? of.time : of.minutes.found;
}

function faultsOf(taken: Taken, at: number, learned: Learned): FieldFault[] {
  const fault = (message: string) => [{ field: `take.${at}`, message }];
  const ofWork = taken.what === 'minutes' || taken.what === 'rejects';
  if (ofWork && (learned.by === 'steps') !== (taken.step !== null)) {
    return fault('This pattern is worked in another way. Open the page again.');
  }
  const found = foundFor(taken, learned);
  if (found === null) return fault('No run has logged this, so there is nothing to use.');
  if ('percent' in found && Number(found.percent) > 99) {
    return fault('Nearly every one failed. Enter the rejects by hand, below 99 %.');
  }
  if ('extraPercent' in found && Number(found.extraPercent) > 200) {
    return fault('Runs took over three times what the layout says. Look at what was taken first.');
  }
  return [];
}

const takes = (take: readonly Taken[], what: Taken['what'], step: number | null) =>
  take.some((each) => each.what === what && each.step === step);

function oneFigure({ minutes, rejects }: Learned, take: readonly Taken[]) {
  return {
    steps: [],
    ...(takes(take, 'minutes', null) && minutes.found
      ? { minutesPer100: minutes.found.per100 }
      : {}),
    ...(takes(take, 'rejects', null) && rejects.found
      ? { rejectPercent: rejects.found.percent }
      : {}),
  };
}

function steps(learned: Learned, take: readonly Taken[]): RunEstimate['steps'] {
  return learned.steps.flatMap(({ position, name, per, time, rejects }) => {
    const figures = {
      ...(takes(take, 'minutes', position) && time
        ? { setupMinutes: time.setupMinutes, secondsPerUnit: time.secondsPerUnit }
        : {}),
      ...(takes(take, 'rejects', position) && rejects ? { rejectPercent: rejects.percent } : {}),
    };
    return Object.keys(figures).length === 0 ? [] : [{ name, per, ...figures }];
  });
}

/** Left out where no rejects are taken. */
function historyAfter(learned: Learned, take: readonly Taken[]): RunEstimate['history'] {
  const taken = take.filter(({ what }) => what === 'rejects');
  if (taken.length === 0) return undefined;
  const all =
    learned.by === 'minutesPer100' ||
    learned.steps.every(
      ({ rejects, position }) => rejects === null || taken.some(({ step }) => step === position),
    );
  const { good, of } = learned.history;
  return all && good !== null && of !== null ? { good, total: of } : null;
}
