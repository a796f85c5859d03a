import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';

/** What one plate costs and lasts. The figures to start from: common practice, no source. */
export function PlateOfferFields() {
  return (
    <>
      <MoneyField name="price" label="Price of one plate" />
      <NumberField
        name="lifeUses"
        label="Lasts"
        unit="impressions"
        whenEmpty="text"
        help="by your own experience; to start from: magnesium some 10,000, brass some 100,000"
      />
    </>
  );
}
