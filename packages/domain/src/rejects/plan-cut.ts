import { InvalidInput } from '../errors/domain-error.ts';
import { plainAllowance, upToFull, upToFullRows } from './allowance.ts';
import { chanceOfEnough } from './chance.ts';
import { cutCount } from './cut-count.ts';

export interface CutAsked {
  /** pieces ordered, 1 or more */
  good: number;
  /** share of the pieces that come out good, as entered; above 0, up to 1 */
  rate: number;
  /** good pieces out of those cut in the shop's own runs; null or left out before there are any */
  history?: { good: number; total: number } | null | undefined;
  /** chance that enough come out good, between 0 and 1 */
  confidence: number;
  /** pieces from a panel or strip */
  perContainer: number;
  /** pieces in each row of it in cutting order, or in every row; left out where it has no rows */
  perRow?: number | readonly number[] | undefined;
}

/** How many to cut, and what stands beside it. */
export interface CutPlan {
  /** the fewest pieces that give enough good ones with the confidence asked */
  cutCount: number;
  /** the chance that they do */
  probability: number;
  /** whether the chance rests on the shop's own runs or on the entered rate */
  basis: 'history' | 'rate';
  /** the cut count rounded up to full rows; null where the layout has none */
  fullRows: { rows: number; pieces: number; overs: number } | null;
  /** the cut count rounded up to whole panels or strips */
  containers: number;
  cutPieces: number;
  /** pieces in the whole containers beyond the cut count */
  overs: number;
  /** pieces ordered ÷ rate, and the chance that those give enough */
  plain: { pieces: number; probability: number };
}

/**
 * The cut count of a run: binomial from the entered rate, beta-binomial once there is history. The
 * plain allowance beside it is enough on average, and short about every other time. Both suppose that
 * pieces fail one by one; a die that shifts fails a whole row.
 * @throws InvalidInput · NotWorkable where nearly everything fails
 */
export function planCut(asked: CutAsked): CutPlan {
  const { good, rate, history, confidence, perContainer, perRow } = asked;
  const learned = history ? soundHistory(history) : null;
  const cut = cutCount(
    learned ? { good, history: learned, confidence } : { good, rate, confidence },
  );
  const full = upToFull(cut.pieces, perContainer);
  const fullRows = perRow === undefined ? null : upToFullRows(cut.pieces, perRow);
  const plain = plainAllowance(good, rate);
  return {
    cutCount: cut.pieces,
    probability: toSixDigits(cut.probability),
    basis: learned ? 'history' : 'rate',
    fullRows,
    containers: full.containers,
    cutPieces: full.pieces,
    overs: full.overs,
    plain: { pieces: plain, probability: toSixDigits(chanceOfEnough(plain, good, rate)) },
  };
}

/** A history in which nothing came out good would say that nothing ever will. */
function soundHistory(history: { good: number; total: number }): { good: number; total: number } {
  if (history.good > 0) return history;
  throw new InvalidInput(
    'history',
    'No good piece has come out of the runs before: enter a rate by hand instead.',
  );
}

const toSixDigits = (chance: number): number => Math.round(chance * 1e6) / 1e6;
