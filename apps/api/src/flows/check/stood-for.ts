import type { StandInStock } from '@hidewright/domain';

interface Lacking {
  jobId: number;
  hardwareId?: number;
  quantity: number;
}

type Which = { jobId: number; hardwareId: number };

/**
 * What jobs still lack, less what each has of other hardware in its place, held or taken. Only what a job has beyond
 * its own need counts, and once: several lines that the same may stand in for share it in their order.
 * @param spareOf how many of some hardware a job has beyond what it needs of it
 */
export function withoutStoodFor<Each extends Lacking>(
  lacking: readonly Each[],
  standInsOf: (hardwareId: number) => readonly StandInStock[],
  spareOf: (which: Which) => number,
): Each[] {
  const used = new Map<string, number>();
  const keyOf = ({ jobId, hardwareId }: Which) => `${jobId} ${hardwareId}`;
  const spare = (which: Which) => spareOf(which) - (used.get(keyOf(which)) ?? 0);

  function use({ parts }: StandInStock, jobId: number, most: number): number {
    const sets = parts.map(({ hardwareId, quantity }) =>
      Math.floor(spare({ jobId, hardwareId }) / quantity),
    );
    const count = Math.max(0, Math.min(most, ...sets));
    for (const { hardwareId, quantity } of parts) {
      const key = keyOf({ jobId, hardwareId });
      used.set(key, (used.get(key) ?? 0) + count * quantity);
    }
    return count;
  }

  return lacking
    .map((each) => {
      const standIns = each.hardwareId === undefined ? [] : standInsOf(each.hardwareId);
      const left = standIns.reduce((open, by) => open - use(by, each.jobId, open), each.quantity);
      return { ...each, quantity: left };
    })
    .filter(({ quantity }) => quantity > 0);
}
