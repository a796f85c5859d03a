import { Decimal } from 'decimal.js';
import { useWatch } from 'react-hook-form';
import { carriageBasisCards } from '../../../components/carriage-bases.ts';
import { MoneyField } from '../../../components/money-field.tsx';
import { More } from '../../../components/more.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { isFigure } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What it cost to bring the delivery: part of what the goods cost. */
export function CarriageFields() {
  const { currency } = useWorkshop();
  const [freight, duty] = useWatch({ name: ['freight', 'duty'] }) as string[];
  const typed = [freight, duty].filter((amount) => amount !== undefined && isFigure(amount));
  const sum = Decimal.sum(0, ...(typed as string[]));
  const note = sum.isZero() ? 'none' : `${currency} ${moneyText(sum.toFixed())}`;
  return (
    <More word="Freight and duty" note={note} names={['freight', 'duty', 'sharedBy']}>
      <p className="max-w-prose text-ink-soft">
        It becomes part of what the goods cost. If it is not known yet, it can be typed on the
        order’s page later, until something of the delivery is used.
      </p>
      <MoneyField name="freight" label="Freight" short />
      <MoneyField name="duty" label="Duty" short />
      <RadioCards name="sharedBy" label="Shared out" cards={carriageBasisCards} />
    </More>
  );
}
