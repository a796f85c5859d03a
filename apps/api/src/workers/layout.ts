import {
  DomainError,
  layOut as layOutPieces,
  type Layout,
  type LayoutInput,
} from '@hidewright/domain';

/** An error's class is lost between threads, so a refusal travels as a value. */
export type LayoutAnswer = { layout: Layout } | { refusal: string };

export function layOut(input: LayoutInput): LayoutAnswer {
  try {
    return { layout: layOutPieces(input) };
  } catch (error) {
    if (error instanceof DomainError) return { refusal: error.message };
    throw error;
  }
}
