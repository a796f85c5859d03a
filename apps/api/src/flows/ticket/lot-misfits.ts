import type { JobLot } from '@hidewright/contract';
import { weightOfLots } from '@hidewright/domain';
import type { Lot } from '../../modules/lots/lot.entity.ts';
import { misfitsThrough, type SetLine } from '../set-hardware.ts';

/** What of a job's hardware does not fit a lot by the weight that it has of its own; nothing where it has none. */
export const misfitsWith = (
  { tag, weightOz }: Pick<Lot, 'tag' | 'weightOz'>,
  lines: readonly SetLine[],
): JobLot['misfits'] =>
  weightOz === null ? [] : misfitsThrough(lines, [weightOfLots(weightOz.toString(), [tag])]);
