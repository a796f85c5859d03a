import {
  DomainError,
  layOut as layOutPieces,
  layOutSide as layOutOnSide,
  type Layout,
  type LayoutInput,
  type SideInput,
  type SideLayout,
} from '@hidewright/domain';

/** An error's class is lost between threads, so a refusal travels as a value. */
export type LayoutAnswer<Laid> = { layout: Laid } | { refusal: string };

export const layOut = (input: LayoutInput): LayoutAnswer<Layout> =>
  answered(() => layOutPieces(input));

export const layOutSide = (input: SideInput): LayoutAnswer<SideLayout> =>
  answered(() => layOutOnSide(input));

function answered<Laid>(lay: () => Laid): LayoutAnswer<Laid> {
  try {
    return { layout: lay() };
  } catch (error) {
    if (error instanceof DomainError) return { refusal: error.message };
    throw error;
  }
}
