import type { PurchaseOrder, Receipt } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { percentText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { answerWords } from '../answer-words.ts';
import { AnswerDialog } from './answer-dialog.tsx';
import { ClaimDialog } from './claim-dialog.tsx';

interface ShortNoticeProps {
  receipt: Receipt;
  /** The order to claim it on; none where nobody can be claimed from. */
  order: PurchaseOrder | undefined;
  isOwner: boolean;
}

/** Which lots of a delivery are short of their mark and not claimed, and whether they are to be; nothing where none is. */
export function ShortNotice({ receipt, order, isOwner }: ShortNoticeProps) {
  const workshop = useWorkshop();
  const [asking, setAsking] = useState<'claim' | 'not'>();
  const close = () => setAsking(undefined);
  const short = receipt.lines.filter((line) => line.marked?.short && line.claimId === null);
  if (short.length === 0) return null;
  const { notClaimed, tolerancePercent } = receipt;
  const tags = short.map((line) => line.lotTag).join(', ');
  const what = `${tags}: more than ${percentText(tolerancePercent)} smaller than marked`;
  return (
    <>
      <Notice
        tone={notClaimed ? 'info' : 'attention'}
        className="mb-4"
        title={notClaimed ? 'Short of the mark, not claimed:' : countWords(short.length)}
        actions={
          isOwner &&
          order && (
            <>
              <Button
                tone={notClaimed ? 'secondary' : 'primary'}
                onClick={() => setAsking('claim')}
              >
                Claim it
              </Button>
              {!notClaimed && (
                <Button tone="quiet" onClick={() => setAsking('not')}>
                  Do not claim
                </Button>
              )}
            </>
          )
        }
      >
        {notClaimed ? answerWords(what, notClaimed, workshop) : `${what}.`}
      </Notice>
      {asking === 'claim' && order && (
        <ClaimDialog order={order} receipt={receipt} onClose={close} />
      )}
      {asking === 'not' && <AnswerDialog receipt={receipt} matter="short" onClose={close} />}
    </>
  );
}

const countWords = (lots: number) =>
  lots === 1 ? 'One lot is short of its mark.' : `${lots} lots are short of their mark.`;
