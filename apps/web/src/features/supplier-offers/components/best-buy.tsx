import type { SupplierOfferReply } from '@hidewright/contract';
import { bestBuy, MM2_PER_FT2, type OfferedBuy } from '@hidewright/domain';
import { useState } from 'react';
import { PlainField } from '../../../components/plain-field.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { areaUnits, readArea } from '../../../lib/units.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { buyMoreText, hasPrice, leftOutText, neededFault, quantityText } from '../offer-words.ts';

type Unit = SupplierOfferReply['unit'];

/** What a quantity really costs from each supplier whose price is known, the least dear first. */
export function BestBuy({ offers: all }: { offers: readonly SupplierOfferReply[] }) {
  const workshop = useWorkshop();
  const [text, setText] = useState('');
  const offers = all.filter(hasPrice);
  if (offers.length === 0) return null;
  const unit = offers[0]?.unit ?? 'piece';
  const needed = readNeeded(text, unit, workshop);
  const wrong = text.trim() !== '' && needed === undefined;
  const sign = unit === 'mm2' ? areaUnits[workshop.areaUnit].sign : 'pieces';
  return (
    <div className="mt-5 border-t border-stitch pt-4">
      <p className="mb-3 max-w-prose text-ink-soft">
        Where does it cost least? Type what you need: what it comes to at each supplier stands here,
        with minimum, packs and price breaks.
      </p>
      <PlainField
        label={unit === 'mm2' ? 'So much is needed' : 'So many are needed'}
        unit={sign}
        value={text}
        error={wrong ? neededFault(text, unit, workshop.areaUnit) : undefined}
        onChange={setText}
      />
      <div role="status">
        {needed !== undefined && (
          <>
            <Answers buys={buysFor(offers, needed, unit)} offers={offers} />
            <p className="mt-3 text-sm text-ink-soft empty:hidden">{leftOutText(all)}</p>
          </>
        )}
      </div>
    </div>
  );
}

function readNeeded(text: string, unit: Unit, { areaUnit }: Workshop): string | undefined {
  const value =
    unit === 'mm2'
      ? readArea(text, areaUnit)
      : /^\d{1,8}$/.test(text.trim())
        ? text.trim()
        : undefined;
  return value === undefined || Number(value) === 0 ? undefined : String(value);
}

function buysFor(offers: readonly SupplierOfferReply[], needed: string, unit: Unit): OfferedBuy[] {
  return bestBuy({
    needed,
    pricedAmount: unit === 'mm2' ? MM2_PER_FT2 : '1',
    offers: offers.map(({ id, usualLeadDays, preferred, minimum, multiple, breaks = [] }) => ({
      ...{ id, preferred, minimum, multiple, breaks },
      leadDays: usualLeadDays,
    })),
  });
}

interface AnswersProps {
  buys: readonly OfferedBuy[];
  offers: readonly SupplierOfferReply[];
}

function Answers({ buys, offers }: AnswersProps) {
  const workshop = useWorkshop();
  return (
    <ol className="mt-3 space-y-3">
      {buys.map((buy) => {
        const offer = offers.find(({ id }) => id === buy.id);
        if (offer === undefined) return null;
        const { plain } = buy;
        const advice = buyMoreText(buy, offer.unit, workshop);
        return (
          <li key={buy.id}>
            <p>
              <strong className="font-semibold">{`${moneyText(plain.cost)} ${workshop.currency}`}</strong>
              {` for ${quantityText(plain.quantity, offer.unit, workshop)} from ${offer.supplierName}, in ${offer.usualLeadDays} days`}
            </p>
            {advice && <p className="text-sm text-ink-soft">{advice}</p>}
          </li>
        );
      })}
    </ol>
  );
}
