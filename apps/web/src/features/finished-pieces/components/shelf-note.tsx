import { useInfiniteQuery } from '@tanstack/react-query';
import { TextLink } from '../../../components/text-link.tsx';
import { finishedPiecesQuery } from '../finished-pieces.queries.ts';
import { shelfWords } from '../finished-words.ts';

interface ShelfNoteProps {
  patternId: number;
  customerId: number | undefined;
}

/** Before a pattern is quoted: what of it lies finished already, for this customer. */
export function ShelfNote({ patternId, customerId }: ShelfNoteProps) {
  const { data } = useInfiniteQuery(finishedPiecesQuery({ patternId, there: 'yes' }));
  const words = shelfWords(data?.pages.flatMap((page) => page.items) ?? [], customerId);
  return words === undefined ? null : (
    <p role="status" className="mt-2 text-ink-soft">
      {words} <TextLink to="/stockroom/finished">Finished pieces</TextLink>
    </p>
  );
}
