import type { Receipt } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { answerWords, differenceWords } from '../answer-words.ts';
import { AnswerDialog } from './answer-dialog.tsx';

/** What a delivery cost other than was ordered, and that it is let stand; nothing where it cost what was ordered. */
export function PriceNotice({ receipt, isOwner }: { receipt: Receipt; isOwner: boolean }) {
  const workshop = useWorkshop();
  const [asking, setAsking] = useState(false);
  const { priceDifference = '0', letStand } = receipt;
  if (Number(priceDifference) === 0) return null;
  const difference = differenceWords(priceDifference, workshop);
  if (letStand)
    return (
      <Notice className="mb-4" title="Price let stand:">
        {answerWords(difference, letStand, workshop)}
      </Notice>
    );
  return (
    <>
      <Notice
        tone="attention"
        className="mb-4"
        title="Not at its price:"
        actions={isOwner && <Button onClick={() => setAsking(true)}>Let the price stand</Button>}
      >
        {difference}.
      </Notice>
      {asking && <AnswerDialog receipt={receipt} matter="price" onClose={() => setAsking(false)} />}
    </>
  );
}
