import type { LayoutSource } from '@hidewright/contract';
import { DomainError, handCount, layOut, type Layout } from '@hidewright/domain';

/** A layout, or the sentence that says why there is none. */
export type LaidOut = { layout: Layout } | { refusal: string };

/** The same working out as on the server. */
export function laidOut(source: LayoutSource): LaidOut {
  try {
    return { layout: source.by === 'outline' ? layOut(source.input) : handCount(source.counted) };
  } catch (error) {
    if (error instanceof DomainError) return { refusal: error.message };
    throw error;
  }
}
