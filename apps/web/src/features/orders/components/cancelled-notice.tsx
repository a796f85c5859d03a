import type { Order } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { Notice } from '../../../components/notice.tsx';
import { instantText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface CancelledNoticeProps {
  order: Order;
  /** What can still be done. */
  actions?: ReactNode | undefined;
}

/** Why it was cancelled, by whom and when. */
export function CancelledNotice({ order, actions }: CancelledNoticeProps) {
  const { timeZone } = useWorkshop();
  const { cancellation } = order;
  if (cancellation === null) return null;
  return (
    <Notice tone="info" title="Cancelled:" actions={actions}>
      {cancellation.why} ({cancellation.by}, {instantText(cancellation.at, timeZone)})
    </Notice>
  );
}
