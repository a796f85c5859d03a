import type { StockCount } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { say } from '../../../components/toast.ts';
import { useHandInCount } from '../counts.mutations.ts';

interface HandInProps {
  sheet: StockCount;
  /** How many figures have not arrived yet. */
  waiting: number;
  send: () => Promise<void>;
}

/** The end of a sheet: how far it is, and giving it to the owner. */
export function HandIn({ sheet, waiting, send }: HandInProps) {
  const [asking, setAsking] = useState(false);
  const handIn = useHandInCount();
  const left = sheet.lineCount - sheet.countedCount;

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
      <Button tone="primary" size="bench" onClick={() => setAsking(true)}>
        Hand it in
      </Button>
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
