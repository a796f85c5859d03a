import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { More } from '../../../components/more.tsx';

const names = ['servicePercent', 'orderCost', 'holdingPercent'];

/** By what the stockroom works out when and how much to order. */
export function OrderingFields() {
  return (
    <More word="When and how much to order" names={names}>
      <DecimalField
        name="servicePercent"
        label="Stock should last until a delivery"
        unit="% of times"
        help="The surer, the earlier it is ordered and the more lies on the shelf."
      />
      <MoneyField
        name="orderCost"
        label="Placing an order costs"
        per="order"
        help="The time for it, and carriage that does not depend on how much is ordered."
      />
      <DecimalField
        name="holdingPercent"
        label="Keeping a thing for a year costs"
        unit="% of its price"
        help="Money that lies still, room on the shelf, and what ages."
      />
    </More>
  );
}
