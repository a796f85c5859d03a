import type { Order } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { instantText } from '../lib/formatting.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import { Notice } from './notice.tsx';

interface CancelledNoticeProps {
  /** Null where it was not cancelled. */
  cancellation: Order['cancellation'];
  /** What can still be done. */
  actions?: ReactNode | undefined;
}

/** Why an order was cancelled, by whom and when. */
export function CancelledNotice({ cancellation, actions }: CancelledNoticeProps) {
  const { timeZone } = useWorkshop();
  if (cancellation === null) return null;
  return (
    <Notice tone="info" title="Cancelled:" actions={actions}>
      {cancellation.why} ({cancellation.by}, {instantText(cancellation.at, timeZone)})
    </Notice>
  );
}
