import type { CountLine, StockCount } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useApproveCount, useCountAgain } from '../counts.mutations.ts';
import { countQuery } from '../counts.queries.ts';
import { differencesGo } from '../count-words.ts';
import { CountLinesTable } from './count-lines-table.tsx';

/** What was counted against the books: look, have lines counted again, approve. */
export function CountReview({ sheet, isOwner }: { sheet: StockCount; isOwner: boolean }) {
  const [again, setAgain] = useState<readonly number[]>([]);
  /** The version that the question is about: what comes in meanwhile was not looked at. */
  const [asking, setAsking] = useState<number>();
  const client = useQueryClient();
  const recount = useCountAgain();
  const approve = useApproveCount();
  const { currency } = useWorkshop();
  const decides = isOwner && sheet.state === 'handed in';
  const params = { id: sheet.id };
  const differences = sheet.lines.filter(differs).length;

  async function askAgain() {
    await recount.mutateAsync({ params, body: { lineIds: [...again] } });
    setAgain([]);
    say(`${sheet.title} is back for counting.`);
  }

  async function approveIt() {
    try {
      await approve.mutateAsync({ params, body: {}, ifMatch: asking });
      say(`${sheet.title} is approved.`);
    } catch (refusal) {
      // Behind the question stands what is to be looked at now.
      if (refusal instanceof ApiProblem && [409, 412].includes(refusal.status))
        await client.invalidateQueries({ queryKey: countQuery(sheet.id).queryKey });
      throw refusal;
    }
  }

  return (
    <div className="space-y-4">
      {recount.error && (
        <Notice tone="danger" live>
          {recount.error.message}
        </Notice>
      )}
      <CountLinesTable sheet={sheet} chosen={again} onChoose={decides ? setAgain : undefined} />
      {decides && (
        <div className="flex flex-wrap justify-end gap-2">
          <Button
            className="min-h-11"
            disabled={again.length === 0}
            busy={recount.isPending}
            onClick={() => void askAgain()}
          >
            {again.length === 0
              ? 'Tick lines to count again'
              : `Count ${lineWord(again.length)} again`}
          </Button>
          <Button tone="primary" className="min-h-11" onClick={() => setAsking(sheet.version)}>
            Approve
          </Button>
        </div>
      )}
      <ConfirmDialog
        open={asking !== undefined}
        onOpenChange={() => setAsking(undefined)}
        title={`Approve ${sheet.title}?`}
        confirmWord="Approve it"
        refusedWord="Look at it again"
        onConfirm={approveIt}
      >
        {differences === 0
          ? 'Everything is as the books say; nothing moves.'
          : `${differencesGo(differences, `${moneyText(sheet.differenceValue ?? '0')} ${currency}`)} into the ledger and cannot be taken out again.`}
      </ConfirmDialog>
    </div>
  );
}

const lineWord = (count: number) => (count === 1 ? '1 line' : `${count} lines`);

const differs = ({ differenceAreaMm2, differenceQuantity }: CountLine): boolean =>
  Number(differenceAreaMm2 ?? differenceQuantity ?? 0) !== 0;
