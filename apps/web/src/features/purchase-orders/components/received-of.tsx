import type { PurchaseLine } from '@hidewright/contract';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { receivedWords } from '../received-words.ts';

/** What came of a line, and what of that went back. */
export function ReceivedOf({ line }: { line: PurchaseLine }) {
  const { came, sentBack } = receivedWords(line, useWorkshop());
  return (
    <>
      {came}
      {sentBack !== undefined && <span className="block text-sm text-brass">{sentBack}</span>}
    </>
  );
}
