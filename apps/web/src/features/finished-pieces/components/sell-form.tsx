import { sellFinished, type FinishedPiece, type Invoice } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { CustomerField } from '../../../components/customer-field.tsx';
import { Form } from '../../../components/form.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { countText } from '../../../lib/formatting.ts';
import { useSellFinished } from '../finished-pieces.mutations.ts';
import { DraftChoice } from './draft-choice.tsx';
import { RateField, type RateFieldProps } from './rate-field.tsx';
import { SaleSum } from './sale-sum.tsx';

interface SellFormProps extends RateFieldProps {
  draftKey: string;
  piece: FinishedPiece;
  customers: readonly Choice[];
  /** Who is chosen to begin with, where nobody's mark decides. */
  buyer: number | undefined;
  newCustomer: (onAdded: (id: number) => void) => ReactNode;
  /** Chosen to begin with; nothing at the first invoice, when it must be said. */
  usualRate: number | null | undefined;
  actions: ReactNode;
  onSold: (invoice: Invoice, quantity: number) => unknown;
}

/** Sells pieces of one kind: they leave the shelf, and stand on a draft invoice. */
export function SellForm(props: SellFormProps) {
  const { piece, customers, buyer, newCustomer, rates, newRate, usualRate, actions, onSold } =
    props;
  const sell = useSellFinished();
  const { id, customerId, customerName, onHand } = piece;
  return (
    <Form
      schema={sellFinished.body}
      defaults={{
        ...{ customerId: customerId ?? buyer ?? ('' as unknown as number), draftId: null },
        ...{ quantity: '' as unknown as number, unitPrice: '' },
        ...(usualRate !== undefined && { taxRateId: usualRate }),
      }}
      submitWord="Sell them"
      actions={actions}
      draftKey={props.draftKey}
      onSend={async (body) =>
        onSold(await sell.mutateAsync({ params: { id }, body }), body.quantity)
      }
    >
      {customerId === null ? (
        <CustomerField choices={customers} newCustomer={newCustomer} />
      ) : (
        <p>
          To <strong>{customerName}</strong>
          <span className="text-ink-soft">: they bear their mark, and go to nobody else.</span>
        </p>
      )}
      <DraftChoice />
      <NumberField
        name="quantity"
        label="How many"
        unit="pieces"
        help={onHand === 1 ? '1 is on the shelf.' : `${countText(onHand)} are on the shelf.`}
      />
      <MoneyField name="unitPrice" label="Price each" per="piece" help="Before tax." />
      <SaleSum piece={piece} />
      <RateField rates={rates} newRate={newRate} />
    </Form>
  );
}
