import type { LayoutSource } from '@hidewright/contract';
import { DomainError, handCount, layOut, type Layout, type Watch } from '@hidewright/domain';
import type { Searching } from '../../components/search-progress.tsx';

/** A layout, or the sentence that says why there is none. */
export type LaidOut = { layout: Layout } | { refusal: string };

/** What the worker says: how far it is, and in the end the answer. */
export type LayoutNews = { searching: Searching } | { answer: LaidOut };

/** The same working out as on the server. */
export function laidOut(source: LayoutSource, watch: Watch = {}): LaidOut {
  try {
    const layout =
      source.by === 'outline' ? layOut(source.input, watch) : handCount(source.counted);
    return { layout };
  } catch (error) {
    if (error instanceof DomainError) return { refusal: error.message };
    throw error;
  }
}
