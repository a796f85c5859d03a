import type { PurchaseLine } from '@hidewright/contract';
import { Plus } from 'lucide-react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { useFocusKept } from '../../../components/use-focus-kept.ts';
import { rackAreaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { blankLot, isOpen, lotBack, nextLot, type TypedLot } from '../typed-delivery.ts';
import { ReceivedLegend } from './received-legend.tsx';
import { ReceivedLot } from './received-lot.tsx';

interface ReceivedLotListProps {
  lines: readonly PurchaseLine[];
  leathers: readonly Choice[];
  tolerancePercent: string;
  mayPrice: boolean;
}

/** The lots that came, each a card; of an order, one press adds another of the same leather, or of one not ordered. */
export function ReceivedLotList(props: ReceivedLotListProps) {
  const { lines, leathers, tolerancePercent, mayPrice } = props;
  const { fields, append, remove } = useFieldArray<{ lots: TypedLot[] }>({ name: 'lots' });
  const { list, keepFocus } = useFocusKept<HTMLFieldSetElement>();
  const workshop = useWorkshop();
  const open = lines.filter((line) => line.of !== 'hardware' && isOpen(line));
  const aside = lines.length > 0 && open.length === 0 && fields.length === 0;
  const { getValues } = useFormContext<{ lots: TypedLot[] }>();

  function addOf(line: PurchaseLine) {
    const before = getValues('lots').findLast((lot) => lot.purchaseLineId === line.id);
    const blank =
      line.service === null ? blankLot(line.leatherId ?? undefined, line.id) : lotBack(line, '');
    const field = line.service === null ? 'markedAreaMm2' : 'measuredAreaMm2';
    append(nextLot(before, blank), { focusName: `lots.${fields.length}.${field}` });
  }

  const toCome = ({ service, toCome: { areaMm2 } }: PurchaseLine) =>
    areaMm2 === null
      ? ''
      : `${rackAreaText(areaMm2, workshop)} ${service === null ? 'to come' : 'went out'}`;

  return (
    <fieldset ref={list} tabIndex={-1}>
      <ReceivedLegend aside={aside}>Leather</ReceivedLegend>
      <div className="space-y-4">
        {fields.map((field, at) => {
          const line = lines.find(({ id }) => id === field.purchaseLineId);
          return (
            <ReceivedLot
              key={field.id}
              at={at}
              ordered={
                line && { name: line.name, toCome: toCome(line), isWork: line.of === 'service' }
              }
              leathers={leathers}
              tolerancePercent={tolerancePercent}
              mayPrice={mayPrice}
              onRemove={() => {
                remove(at);
                keepFocus();
              }}
            />
          );
        })}
      </div>
      <div className="mt-3 flex flex-wrap gap-2">
        {open.map((line) => (
          <Button key={line.id} className="min-h-11" onClick={() => addOf(line)}>
            <Plus size={18} aria-hidden="true" />
            {line.service === null
              ? `A lot of ${line.name}`
              : `Another lot from ${line.service.lotTag}`}
          </Button>
        ))}
        <Button
          className="min-h-11"
          tone={lines.length === 0 ? 'secondary' : 'quiet'}
          onClick={() =>
            append(blankLot(undefined, null), { focusName: `lots.${fields.length}.leatherId` })
          }
        >
          <Plus size={18} aria-hidden="true" />
          {lines.length === 0 ? 'A lot of leather' : 'Other leather came with it'}
        </Button>
      </div>
    </fieldset>
  );
}
