import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { More } from '../../../components/more.tsx';
import { PriceRuleField } from '../../../components/price-rule-field.tsx';

const rates = ['minimumWagePerHour', 'restPercent', 'overheadPerHour'];

/** What an hour costs beside the wage; nought until somebody says otherwise. */
export function RatesFields() {
  return (
    <More word="Minimum wage, rest and overhead" names={rates}>
      <MoneyField
        name="minimumWagePerHour"
        label="Minimum wage"
        per="hour"
        help="Piece rates and wages are held against it; the local authority’s rules come first."
      />
      <DecimalField
        name="restPercent"
        label="Allowance for rest"
        unit="%"
        help="On top of all bench time."
      />
      <MoneyField
        name="overheadPerHour"
        label="Overhead"
        per="hour"
        help="Rent, light and insurance, for each bench hour."
      />
    </More>
  );
}

const charges = ['packingPerPiece', 'cardFeePercent', 'cardFeeEach', 'setUpCharge', 'minimumOrder'];

/** What an order is charged beside its pieces, and how a price comes about. */
export function ChargesFields() {
  return (
    <More word="Prices, charges and fees" names={[...charges, 'priceRule']}>
      <PriceRuleField
        name="priceRule"
        label="A price that nobody typed should"
        help="A quote can have another rule, and each of its quantities too."
      />
      <MoneyField
        name="setUpCharge"
        label="Set-up charge"
        per="order"
        help="Charged once for every order. 0 asks for none."
      />
      <MoneyField
        name="minimumOrder"
        label="Minimum order"
        help="An order comes to at least so much, tooling and carriage aside."
      />
      <MoneyField name="packingPerPiece" label="Packing" per="piece" />
      <DecimalField
        name="cardFeePercent"
        label="Card fees"
        unit="%"
        help="What the card company keeps of the total."
      />
      <MoneyField name="cardFeeEach" label="and of each payment" />
    </More>
  );
}
