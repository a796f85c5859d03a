import type { RunBasis } from '@hidewright/contract';
import { rejectShare } from '@hidewright/domain';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { percentText, unitPriceText } from '../../../lib/formatting.ts';

/** Values that are worked out or looked up, and can be set by hand for this quote alone. */
export function OverrideFields({ basis }: { basis: RunBasis | undefined }) {
  if (!basis) return null;
  const { leather } = basis.input;
  return (
    <More word="Set by hand, for this quote alone" names={['overrides']}>
      {basis.design && <OwnRuns design={basis.design} />}
      <MoneyField
        name="overrides.leatherPricePerFt2"
        label="Leather price"
        per="ft²"
        optional
        help={`${leather.name} is ${unitPriceText(leather.pricePerFt2)} per ft².`}
      />
      <DecimalField
        name="overrides.rejectPercent"
        label="Rejects"
        unit="%"
        optional
        help={`The pattern says ${percentText(rejectsOf(basis))}${basis.input.history ? ', and its own runs are counted with' : ''}.`}
      />
    </More>
  );
}

/** That this customer's numbers are not quite the pattern's. */
function OwnRuns({ design }: { design: NonNullable<RunBasis['design']> }) {
  const { customerId, customerName, patternId } = design;
  return (
    <p className="text-ink-soft">
      {`Minutes and rejects go by ${customerName}’s own runs. `}
      <TextLink to={`/pattern-room/patterns/${patternId}/learned?customer=${customerId}`}>
        See them
      </TextLink>
    </p>
  );
}

/** Of all pieces cut, over all steps. */
const rejectsOf = ({ input }: RunBasis): string => (rejectShare(input.work) * 100).toFixed(1);
