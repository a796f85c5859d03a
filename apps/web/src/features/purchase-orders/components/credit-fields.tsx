import type { SupplierClaim } from '@hidewright/contract';
import { Checkbox } from '../../../components/checkbox.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What a supplier credited; more than was claimed is said, so that it is no slip. */
export function CreditFields({ claim }: { claim: SupplierClaim }) {
  const { currency } = useWorkshop();
  return (
    <>
      <MoneyField name="credited" label="Credited" />
      <Checkbox
        name="moreThanClaimed"
        label={`They credited more than the ${currency} ${moneyText(claim.worth ?? '0')} claimed`}
        help="Such as a part of the freight as well."
      />
    </>
  );
}
