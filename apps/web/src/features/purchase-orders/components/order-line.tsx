import { X } from 'lucide-react';
import type { SupplierOfferReply } from '@hidewright/contract';
import { unitWord } from '@hidewright/domain';
import { useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { AreaPriceField } from '../../../components/area-price-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { lineText, offeredPrice, termsOf, type LineTerms } from '../line-terms.ts';
import type { Goods } from '../typed-order.ts';
import { useOfferedPrice } from '../use-offered-price.ts';

interface OrderLineProps {
  at: number;
  of: 'leather' | 'hardware';
  goods: readonly Goods[];
  /** What the chosen supplier sells; undefined while it is being asked for. */
  offers: readonly SupplierOfferReply[] | undefined;
  onRemove: () => void;
}

/** One line: what, how much of it, at which price; what the supplier asks is there as soon as both are chosen. */
export function OrderLine({ at, of, goods, offers, onRemove }: OrderLineProps) {
  const line = `lines.${at}`;
  const what = of === 'leather' ? `${line}.leatherId` : `${line}.hardwareId`;
  const much = of === 'leather' ? `${line}.areaMm2` : `${line}.quantity`;
  const { chosen, terms } = useChosen(
    { of, what, much, price: `${line}.unitPrice` },
    goods,
    offers,
  );
  const unit = chosen?.unit ?? 'piece';
  const packs =
    terms !== undefined || chosen?.packSize === undefined || chosen.packSize === 1
      ? undefined
      : `in packs of ${chosen.packSize}`;
  return (
    <div className="flex flex-wrap items-start gap-x-4 gap-y-2">
      <div className="w-full sm:w-64">
        <SelectField
          name={what}
          label={of === 'leather' ? 'Leather' : 'Hardware or supplies'}
          placeholder="Choose one"
          choices={goods.map(({ id, name }) => ({ value: id, label: name }))}
        />
      </div>
      {of === 'leather' ? (
        <AreaField name={much} label="Area" help={(examples) => examples} />
      ) : (
        <NumberField
          name={much}
          label="How many"
          unit={unit === 'piece' ? undefined : unitWord(unit, 2)}
          help={packs}
        />
      )}
      {of === 'leather' ? (
        <AreaPriceField name={`${line}.unitPrice`} label="Price" />
      ) : (
        <MoneyField name={`${line}.unitPrice`} label="Price" per={unitWord(unit)} />
      )}
      <button
        type="button"
        onClick={onRemove}
        aria-label={`Remove line ${at + 1}`}
        className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
      >
        <X size={18} aria-hidden="true" />
      </button>
      <p role="status" className="basis-full text-sm text-ink-soft empty:hidden">
        {chosen && <LineRemark terms={terms} much={much} price={`${line}.unitPrice`} />}
      </p>
    </div>
  );
}

interface Fields {
  of: 'leather' | 'hardware';
  what: string;
  much: string;
  price: string;
}

/** What is chosen, on which terms; the price follows the supplier's, or else the last one. */
function useChosen(
  { of, what, much, price }: Fields,
  goods: readonly Goods[],
  offers: OrderLineProps['offers'],
) {
  const [id, quantity] = useWatch({ name: [what, much] }) as unknown[];
  const chosen = goods.find((item) => String(item.id) === String(id));
  const terms = chosen && offers && termsOf(offers, of, chosen.id);
  const known = terms ? offeredPrice(terms, quantity) : chosen?.price;
  useOfferedPrice(price, offers === undefined ? undefined : known);
  return { chosen, terms };
}

interface LineRemarkProps {
  terms: LineTerms | undefined;
  /** The fields with the quantity and the price. */
  much: string;
  price: string;
}

function LineRemark({ terms, much, price }: LineRemarkProps) {
  const workshop = useWorkshop();
  const [quantity, typed] = useWatch({ name: [much, price] }) as unknown[];
  return lineText(terms, { much: quantity, price: String(typed ?? '') }, workshop);
}
