import type { RunBasis } from '@hidewright/contract';
import { useWatch } from 'react-hook-form';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { PriceRuleField } from '../../../components/price-rule-field.tsx';
import { More } from '../../../components/more.tsx';
import { moneyText } from '../../../lib/formatting.ts';

/** How prices are worked out, and what is charged beside the pieces; closed until it is wanted. */
export function TermsFields({ basis }: { basis: RunBasis | undefined }) {
  const note = useSetTerms();
  if (!basis) return null;
  const { setUpCharge = '0', minimumOrder = '0' } = basis.input;
  const usually = (amount: string) =>
    Number(amount) === 0 ? 'none, if left empty' : `${moneyText(amount)}, if left empty`;
  return (
    <More word="Prices and terms" note={note} names={names}>
      <PriceRuleField
        name="terms.priceRule"
        label="Prices are worked out"
        emptyWord="as the shop usually does"
      />
      <MoneyField
        name="terms.floorPrice"
        label="No piece goes for less than"
        per="piece"
        optional
        whenEmpty="null"
      />
      <MoneyField
        name="terms.setUpCharge"
        label="Setting up"
        optional
        whenEmpty="null"
        help={`Charged once for the order: ${usually(setUpCharge)}.`}
      />
      <MoneyField
        name="terms.minimumOrder"
        label="Minimum order"
        optional
        whenEmpty="null"
        help={`Without tooling and carriage: ${usually(minimumOrder)}.`}
      />
      <DecimalField
        name="terms.rushPercent"
        label="Rush"
        unit="%"
        optional
        whenEmpty="null"
        help="On top of the pieces, where it is wanted sooner than you would make it."
      />
      <div className="flex flex-wrap gap-x-4 gap-y-2">
        <MoneyField name="terms.carriageCost" label="Carriage costs" optional whenEmpty="null" />
        <MoneyField
          name="terms.carriageCharge"
          label="Carriage charged"
          optional
          whenEmpty="null"
        />
      </div>
      <MoneyField
        name="terms.resalePrice"
        label="Sold on at"
        per="piece"
        optional
        whenEmpty="null"
        help="What a shop sells it for: twice what it pays is usual."
      />
    </More>
  );
}

const words = {
  priceRule: 'a rule of its own',
  floorPrice: 'a floor',
  setUpCharge: 'setting up',
  minimumOrder: 'a minimum',
  rushPercent: 'rush',
  carriageCost: 'carriage',
  carriageCharge: 'carriage charged',
  resalePrice: 'sold on',
};
const names = Object.keys(words).map((name) => `terms.${name}`);

/** What is set on this quote, in a few words. */
function useSetTerms(): string | undefined {
  const terms = (useWatch({ name: 'terms' }) ?? {}) as Record<string, unknown>;
  const set = Object.entries(words).filter(([name]) => (terms[name] ?? '') !== '');
  return set.length === 0 ? undefined : set.map(([, word]) => word).join(', ');
}
