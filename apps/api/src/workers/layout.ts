import { layOut as layOutPieces, type Layout, type LayoutInput } from '@hidewright/domain';

export function layOut(input: LayoutInput): Layout {
  return layOutPieces(input);
}
