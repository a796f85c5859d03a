import type { PurchaseLine } from '@hidewright/contract';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { receivedWords } from '../received-words.ts';

/** What came of a line, by its marks or as measured, and what of that went back. */
export function ReceivedOf({ line }: { line: PurchaseLine }) {
  const { came, measured, sentBack } = receivedWords(line, useWorkshop());
  return (
    <>
      {came}
      {measured !== undefined && <span className="block text-sm text-ink-soft">{measured}</span>}
      {sentBack !== undefined && <span className="block text-sm text-brass">{sentBack}</span>}
    </>
  );
}
