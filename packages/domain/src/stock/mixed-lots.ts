import { tagWords } from './tag-words.ts';

/** A lot that an order is cut from, or may be. */
export interface LotOfOrder {
  lotId: number;
  tag: string;
  /** as it was noted; '' where nobody noted it */
  shade: string;
  /** the lot that it and its offcuts were all cut from; its own id where it was cut from none */
  sideId: number;
}

export interface LotMix {
  of: 'shades' | 'lots';
  sentence: string;
}

/**
 * What to say before a lot joins the others that an order is cut from; null where it is the first, or a piece of the
 * same side. Shades that are noted and differ are said first; lots whose shade nobody noted are not known to agree.
 * One order from one side where it can: common practice, no source.
 */
export function mixedWith(lot: LotOfOrder, others: readonly LotOfOrder[]): LotMix | null {
  const foreign = others.filter(({ sideId }) => sideId !== lot.sideId);
  const unlike = foreign.filter(({ shade }) => shade !== '' && shade !== lot.shade);
  if (lot.shade !== '' && unlike.length > 0)
    return { of: 'shades', sentence: ofShades(lot, unlike) };
  if (foreign.length === 0) return null;
  return { of: 'lots', sentence: ofLots(lot, foreign) };
}

function ofShades(lot: LotOfOrder, unlike: readonly LotOfOrder[]): string {
  const others = tagWords(unlike.map(({ tag, shade }) => `${tag} (${shade})`));
  return `Shades would mix: ${lot.tag} is ${lot.shade}, and this order has ${others}. Lay them side by side before you cut.`;
}

function ofLots(lot: LotOfOrder, foreign: readonly LotOfOrder[]): string {
  const others = tagWords(foreign.map(({ tag }) => tag));
  const alike = lot.shade !== '' && foreign.every(({ shade }) => shade === lot.shade);
  const known = alike
    ? `${foreign.length > 1 ? 'All' : 'Both'} are noted as ${lot.shade}; still lay`
    : 'Their shades are not all noted: lay';
  return `${lot.tag} is another side than ${others}, which this order has. ${known} them side by side before you cut.`;
}
