import type { SupplierOfferReply } from '@hidewright/contract';
import { askedPriceText } from '../../../lib/formatting.ts';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { quantityText } from '../offer-words.ts';

/** The price at each quantity, as a small table of its own. */
export function OfferLadder({ offer }: { offer: SupplierOfferReply }) {
  const workshop = useWorkshop();
  const { breaks, unit, supplierName, minimum } = offer;
  if (breaks === undefined) return null;
  const { areaUnit, currency } = workshop;
  const leather = unit === 'mm2';
  const price = (text: string) => askedPriceText(text, leather ? areaUnit : undefined);
  const from = (text: string, at: number) => {
    const least = at === 0 && minimum !== null ? minimum : text;
    return at === 0 && Number(least) <= 1 ? 'any' : quantityText(least, unit, workshop);
  };
  return (
    <table className="border-collapse">
      <caption className="sr-only">{`Prices of ${supplierName}`}</caption>
      <thead>
        <tr className="text-left text-sm text-ink-soft">
          <th scope="col" className="py-1 pr-6 font-normal">
            From
          </th>
          <th scope="col" className="py-1 text-right font-normal">
            {`${currency} per ${leather ? areaUnits[areaUnit].sign : 'piece'}`}
          </th>
        </tr>
      </thead>
      <tbody>
        {breaks.map((each, at) => (
          <tr key={each.from} className="border-t border-stitch">
            <td className="py-1 pr-6">{from(each.from, at)}</td>
            <td className="py-1 text-right font-semibold tabular-nums">{price(each.price)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
