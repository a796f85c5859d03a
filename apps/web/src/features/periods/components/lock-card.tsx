import type { Period, SalesSheet } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useLockPeriod } from '../periods.mutations.ts';
import { periodText } from '../period-text.ts';

/** Whether these days are locked, or can be. */
export function LockCard({ sheet, locks }: { sheet: SalesSheet; locks: readonly Period[] }) {
  const { today } = useWorkshop();
  const exact = locks.find(
    ({ fromDay, toDay }) => fromDay === sheet.fromDay && toDay === sheet.toDay,
  );
  return (
    <Card title="Lock">
      {exact !== undefined && <Locked sheet={sheet} period={exact} />}
      {exact === undefined && locks.length > 0 && (
        <Notice>
          Already locked: {locks.map(periodText).join('; ')}. To lock the rest, choose days outside{' '}
          {locks.length === 1 ? 'it' : 'them'}.
        </Notice>
      )}
      {locks.length === 0 && sheet.toDay > today && (
        <Notice>
          These days are not over. Choose a last day that is not after today to lock them.
        </Notice>
      )}
      {locks.length === 0 && sheet.toDay <= today && <Lockable sheet={sheet} />}
    </Card>
  );
}

function Locked({ sheet, period }: { sheet: SalesSheet; period: Period }) {
  const { timeZone } = useWorkshop();
  const agrees = JSON.stringify(period.totals) === JSON.stringify(sheet.totals);
  const lockedAt = instantText(period.lockedAt, timeZone);
  return agrees ? (
    <Notice tone="ok" title="Locked.">
      {period.lockedBy} locked these days on {lockedAt}, with these totals.
    </Notice>
  ) : (
    <Notice tone="danger" title="The totals have changed since these days were locked.">
      They stood at {moneyText(period.totals.total)} when {period.lockedBy} locked them on{' '}
      {lockedAt}. Somebody has altered the database: have it verified.
    </Notice>
  );
}

function Lockable({ sheet }: { sheet: SalesSheet }) {
  const { today } = useWorkshop();
  const [asking, setAsking] = useState(false);
  const lock = useLockPeriod();
  const { fromDay, toDay, totals, currency } = sheet;
  const days = periodText(sheet);
  return (
    <>
      <p className="mb-3">
        Download the sheet first, and lock once your bookkeeping has taken it over.
      </p>
      <Button onClick={() => setAsking(true)}>Lock these days</Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title={`Lock ${days}?`}
        confirmWord="Lock them"
        cancelWord="Leave them open"
        onConfirm={async () => {
          await lock.mutateAsync({ body: { fromDay, toDay } });
          say(`${days} is locked.`);
        }}
      >
        Nobody can issue an invoice or record a payment on these days afterwards, and they cannot be
        opened again.
        {toDay === today &&
          ' That includes today: nothing more can be entered until tomorrow.'}{' '}
        They are kept with a total of {moneyText(totals.total)} {currency}, of which tax{' '}
        {moneyText(totals.tax)}, and {moneyText(totals.received)} received.
      </ConfirmDialog>
    </>
  );
}
