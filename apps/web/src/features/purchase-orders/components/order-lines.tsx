import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useMemo } from 'react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { useCheckOnLeaving } from '../../../components/use-check-on-leaving.ts';
import { useFocusKept } from '../../../components/use-focus-kept.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { supplierOffersQuery } from '../../../lib/supplier-offers.queries.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { amountOf, blankLine, blankService, type Goods, type TypedLine } from '../typed-order.ts';
import { useFreeLots } from '../use-free-lots.ts';
import { OrderLine } from './order-line.tsx';
import { ServiceLine } from './service-line.tsx';

interface OrderLinesProps {
  leathers: readonly Goods[];
  hardware: readonly Goods[];
}

/** What is ordered, line by line, and what it comes to. */
export function OrderLines({ leathers, hardware }: OrderLinesProps) {
  const { fields, append, remove } = useFieldArray<{ lines: TypedLine[] }>({ name: 'lines' });
  const offers = useOffers();
  const lines = (useWatch({ name: 'lines' }) ?? []) as TypedLine[];
  const lots = useFreeLots(lines);
  const checkOnLeaving = useCheckOnLeaving();
  const { list, keepFocus } = useFocusKept<HTMLFieldSetElement>();
  const takeOut = (at: number) => {
    remove(at);
    keepFocus();
  };
  const add = (of: 'leather' | 'hardware') =>
    append(blankLine(of), { focusName: `lines.${fields.length}.${of}Id` });
  return (
    <fieldset ref={list} tabIndex={-1} onBlur={checkOnLeaving}>
      <legend className="mb-3 text-lg font-semibold">What to order</legend>
      <div className="space-y-5">
        {fields.map((field, at) =>
          field.of === 'service' ? (
            <ServiceLine
              key={field.id}
              at={at}
              lots={lots}
              leathers={leathers}
              onRemove={() => takeOut(at)}
            />
          ) : (
            <OrderLine
              key={field.id}
              at={at}
              of={field.of}
              goods={field.of === 'leather' ? leathers : hardware}
              offers={offers}
              onRemove={() => takeOut(at)}
            />
          ),
        )}
      </div>
      <div className="mt-2 -ml-3 flex flex-wrap">
        <Button tone="quiet" onClick={() => add('leather')}>
          <Plus size={18} aria-hidden="true" /> Leather
        </Button>
        <Button tone="quiet" onClick={() => add('hardware')}>
          <Plus size={18} aria-hidden="true" /> Hardware or supplies
        </Button>
        <Button
          tone="quiet"
          onClick={() => append(blankService(), { focusName: `lines.${fields.length}.service` })}
        >
          <Plus size={18} aria-hidden="true" /> Work on a lot
        </Button>
      </div>
      <Together amount={amountOf(lines, lots)} />
    </fieldset>
  );
}

function Together({ amount }: { amount: string | undefined }) {
  const { currency } = useWorkshop();
  if (amount === undefined) {
    return <p className="mt-3 text-ink-soft">There is a sum when every figure is right.</p>;
  }
  return (
    <p className="mt-3 font-semibold">
      Together {currency} {moneyText(amount)}
      <span className="font-normal text-ink-soft">, before carriage and tax</span>
    </p>
  );
}

/** What the chosen supplier sells: undefined while it is being asked for, nothing where nobody is chosen. */
function useOffers() {
  const supplierId = Number(useWatch({ name: 'supplierId' }) ?? 0);
  const { data, isLoading } = useQuery({
    ...supplierOffersQuery({ supplierId }),
    enabled: supplierId > 0,
  });
  return useMemo(() => data?.items ?? (isLoading ? undefined : []), [data, isLoading]);
}
