import { describe, expect, it } from 'vitest';
import type { LeatherFacts, LotTaken } from './check-leather.ts';
import { weightsCut } from './weights-cut.ts';

const range = { weightLowOz: '5', weightHighOz: '6' };
const taken = (tag: string, pieces: number, weightOz: string | null) =>
  ({ lot: { tag, weightOz }, pieces }) as LotTaken;
const cut = (piecesNeeded: number, ...takes: LotTaken[]) =>
  weightsCut({ leather: { weight: range }, takes, piecesNeeded } as unknown as LeatherFacts);
const ofLots = (weight: string, ...lots: string[]) => ({
  weightLowOz: weight,
  weightHighOz: weight,
  lots,
});

describe('what weighs the leather of a run', () => {
  it('is each lot’s own weight, those of one weight together', () => {
    const takes = [taken('A', 10, '3'), taken('B', 10, '4.5'), taken('C', 5, '3')];
    expect(cut(25, ...takes)).toEqual([ofLots('3', 'A', 'C'), ofLots('4.5', 'B')]);
  });

  it('is the leather’s range where a lot has none, and for what is yet to come', () => {
    expect(cut(20, taken('A', 20, null))).toEqual([range]);
    expect(cut(20, taken('A', 10, '3'), taken('B', 10, null))).toEqual([range, ofLots('3', 'A')]);
    expect(cut(20, taken('A', 10, '3'))).toEqual([range, ofLots('3', 'A')]);
    expect(cut(20)).toEqual([range]);
  });
});
