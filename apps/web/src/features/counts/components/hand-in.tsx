import type { CountLine, StockCount } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { useHandInCount } from '../counts.mutations.ts';

interface HandInProps {
  sheet: StockCount;
  /** How many figures have not arrived yet. */
  waiting: number;
  /** How many lines have no figure, also none on its way. */
  left: number;
  /** Lines on which something stands that is no figure. */
  unreadable: readonly CountLine[];
  onMend: (lineId: number) => void;
  /** Sends all figures, and throws where one has not arrived. */
  send: () => Promise<void>;
}

/** The end of a sheet: how far it is, and giving it to the owner. */
export function HandIn({ sheet, waiting, left, unreadable, onMend, send }: HandInProps) {
  const [asking, setAsking] = useState(false);
  const [stopped, setStopped] = useState(false);
  const handIn = useHandInCount();

  function ask() {
    const [first] = unreadable;
    setStopped(first !== undefined);
    if (first) onMend(first.id);
    else setAsking(true);
  }

  async function confirm() {
    await send();
    await handIn.mutateAsync({ params: { id: sheet.id }, body: { leaveUncounted: left > 0 } });
    say(`${sheet.title} is handed in.`);
  }

  return (
    <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3">
      <p role="status">
        <strong>{`${sheet.countedCount} of ${sheet.lineCount}`}</strong> counted
        {waiting > 0 && `, ${waiting} on this device waiting to be sent`}
      </p>
      <Button tone="primary" size="bench" onClick={ask}>
        Hand it in
      </Button>
      {stopped && unreadable.length > 0 && (
        <Notice tone="danger" live className="basis-full">
          {`What stands at ${unreadable.map(({ tag }) => tag).join(', ')} is no figure. Mend or empty it, then hand the sheet in.`}
        </Notice>
      )}
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title={`Hand in ${sheet.title}?`}
        confirmWord="Hand it in"
        cancelWord="Go on counting"
        onConfirm={confirm}
      >
        {left === 0
          ? 'The owner looks at the differences next. Nothing is changed until then.'
          : `${left === 1 ? '1 line is' : `${left} lines are`} not counted and will stay as the books say. The owner looks at the rest next.`}
      </ConfirmDialog>
    </div>
  );
}
