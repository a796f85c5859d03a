import {
  DomainError,
  layOut as layOutPieces,
  layOutSide as layOutOnSide,
  type Layout,
  type LayoutInput,
  type SideInput,
  type SideLayout,
} from '@hidewright/domain';
import { watchFrom, type WatchedWork } from './watched.ts';

/** An error's class is lost between threads, so a refusal travels as a value. */
export type LayoutAnswer<Laid> = { layout: Laid } | { refusal: string };

export const layOut = (input: LayoutInput): LayoutAnswer<Layout> =>
  answered(() => layOutPieces(input));

export const layOutSide = (input: SideInput): LayoutAnswer<SideLayout> =>
  answered(() => layOutOnSide(input));

/** What a search that may be stopped has found. */
export interface SideFound {
  side: SideLayout;
  /** It did not come to its end: another time it may find more. */
  stopped: boolean;
}

export function searchSide({ input, ...line }: WatchedWork<SideInput>): LayoutAnswer<SideFound> {
  const watch = watchFrom(line);
  return answered(() => {
    const side = layOutOnSide(input, watch);
    return { side, stopped: watch.wasStopped() };
  });
}

function answered<Laid>(lay: () => Laid): LayoutAnswer<Laid> {
  try {
    return { layout: lay() };
  } catch (error) {
    if (error instanceof DomainError) return { refusal: error.message };
    throw error;
  }
}
