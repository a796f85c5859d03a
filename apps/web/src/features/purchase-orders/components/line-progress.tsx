import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { goodsText, isNothing } from '../goods-text.ts';

interface LineProgressProps {
  line: PurchaseLine;
  order: PurchaseOrder;
  today: string;
  onChangeDay: (() => void) | undefined;
  onCloseLine: (() => void) | undefined;
}

/** What a line still lacks and by when, or what it ended over or short. */
export function LineProgress({ line, order, today, onChangeDay, onCloseLine }: LineProgressProps) {
  const workshop = useWorkshop();
  const { toCome, over, short, expectedOn } = line;
  if (!isNothing(over)) return <strong>{`${goodsText(over, workshop)} over`}</strong>;
  if (!isNothing(short))
    return <strong className="text-brass">{`${goodsText(short, workshop)} short`}</strong>;
  const awaited = order.state === 'sent' || order.state === 'part received';
  if (!awaited) return '–';
  if (isNothing(toCome)) return 'all here';
  const late = expectedOn !== null && expectedOn < today;
  return (
    <span className="block md:text-left">
      {goodsText(toCome, workshop)}
      {expectedOn !== null && (
        <span className={late ? 'block font-semibold text-oxblood' : 'block'}>
          {`${late ? 'late: ' : 'by '}${dayText(expectedOn, today)}`}
        </span>
      )}
      {onChangeDay && (
        <Button tone="quiet" className="-mr-3.5 md:mr-0 md:-ml-3.5" onClick={onChangeDay}>
          Another day<span className="sr-only">{` for ${line.name}`}</span>
        </Button>
      )}
      {onCloseLine && (
        <Button tone="quiet" className="-mr-3.5 md:mr-0 md:-ml-3.5" onClick={onCloseLine}>
          Nothing more<span className="sr-only">{` of ${line.name}`}</span>
        </Button>
      )}
    </span>
  );
}
