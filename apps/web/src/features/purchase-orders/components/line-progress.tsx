import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { goodsText, isNothing } from '../goods-text.ts';
import { whereItIs } from '../service-words.ts';

interface LineProgressProps {
  line: PurchaseLine;
  order: PurchaseOrder;
  today: string;
  onChangeDay: (() => void) | undefined;
  onCloseLine: (() => void) | undefined;
  onReopen: (() => void) | undefined;
}

/** What a line still lacks and by when, or what it ended over or short. */
export function LineProgress(props: LineProgressProps) {
  const { line, order, today, onChangeDay, onCloseLine, onReopen } = props;
  const workshop = useWorkshop();
  const { toCome, over, short, expectedOn, unit } = line;
  if (!isNothing(over)) return <strong>{`${goodsText(over, workshop, unit)} over`}</strong>;
  if (!isNothing(short))
    return (
      <span className="block md:text-left">
        <strong className="block text-brass">{`${goodsText(short, workshop, unit)} short`}</strong>
        {onReopen && (
          <LineButton onClick={onReopen} word="Await the rest" of={` of ${line.name}`} />
        )}
      </span>
    );
  const where = whereItIs(line);
  if (where !== undefined) return where;
  const awaited = order.state === 'sent' || order.state === 'part received';
  if (!awaited) return '–';
  if (isNothing(toCome)) return 'all here';
  const late = expectedOn !== null && expectedOn < today;
  return (
    <span className="block md:text-left">
      {goodsText(toCome, workshop, unit)}
      {expectedOn !== null && (
        <span className={late ? 'block font-semibold text-oxblood' : 'block'}>
          {`${late ? 'late: ' : 'by '}${dayText(expectedOn, today)}`}
        </span>
      )}
      {onChangeDay && (
        <LineButton onClick={onChangeDay} word="Another day" of={` for ${line.name}`} />
      )}
      {onCloseLine && (
        <LineButton
          onClick={onCloseLine}
          word={line.service === null ? 'Nothing more' : 'Call it off'}
          of={line.service === null ? ` of ${line.name}` : `: ${line.name}`}
        />
      )}
    </span>
  );
}

/** Its name ends in the line it is for, which the eye sees beside it. */
function LineButton({ onClick, word, of }: { onClick: () => void; word: string; of: string }) {
  return (
    <Button tone="quiet" className="-mr-3.5 md:mr-0 md:-ml-3.5" onClick={onClick}>
      {word}
      <span className="sr-only">{of}</span>
    </Button>
  );
}
