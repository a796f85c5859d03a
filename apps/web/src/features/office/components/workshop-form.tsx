import { changeWorkshop, type Workshop } from '@hidewright/contract';
import { currencies } from '@hidewright/domain';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { Form } from '../../../components/form.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextArea } from '../../../components/text-area.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useChangeWorkshop } from '../office.mutations.ts';
import { OrderingFields } from './ordering-fields.tsx';
import { ChargesFields, RatesFields } from './rates-fields.tsx';

const areaUnits = [
  { value: 'ft2', label: 'square feet (ft²)' },
  { value: 'dm2', label: 'square decimetres (dm²)' },
  { value: 'm2', label: 'square metres (m²)' },
];
const areaSteps = [
  { value: 'tenth', label: 'tenths, such as 24.8' },
  { value: 'quarter', label: 'quarters, such as 24³' },
];
const lengthUnits = [
  { value: 'mm', label: 'millimetres (mm)' },
  { value: 'in', label: 'inches (in)' },
];
const currencyChoices = currencies.map(({ code, name }) => ({
  value: code,
  label: `${code}, ${name}`,
}));
const stockValueChoices = [
  { value: 'moving average', label: 'moving average: each purchase mixes into the cost' },
  { value: 'first in first out', label: 'first in, first out: the oldest goes first' },
];
const timeZones = [...new Set(['UTC', ...Intl.supportedValuesOf('timeZone')])].map((zone) => ({
  value: zone,
  label: zone.replaceAll('_', ' '),
}));

/** The values that quotes, checks and papers begin with; each quote keeps those it was made with. */
export function WorkshopForm({
  workshop,
  onReload,
}: {
  workshop: Workshop;
  onReload: () => Promise<Workshop>;
}) {
  const send = useChangeWorkshop();
  return (
    <Form
      schema={changeWorkshop.body}
      defaults={typedFrom(workshop)}
      submitWord="Save"
      onReload={async () => typedFrom(await onReload())}
      onSend={async (body) => {
        await send.mutateAsync({ body, ifMatch: workshop.version });
        say('Saved. New quotes begin with these values.');
      }}
    >
      <TextField name="name" label="Name of the shop" />
      <TextArea name="address" label="Address" help="As it stands on quotes and invoices." />
      <SelectField name="currency" label="Currency" choices={currencyChoices} />
      <SelectField name="areaUnit" label="Leather is measured in" choices={areaUnits} short />
      <SelectField
        name="areaShown"
        label="Square feet are shown in"
        choices={areaSteps}
        help="They are kept exactly as they were measured."
      />
      <SelectField name="lengthUnit" label="Lengths are typed in" choices={lengthUnits} short />
      <SelectField
        name="timeZone"
        label="Time zone"
        help="Days begin and end by it."
        choices={timeZones}
      />
      <Stitch />
      <h2>What an hour should earn</h2>
      <MoneyField
        name="targetPerHour"
        label="Target per bench hour"
        per="hour"
        help="What a bench hour should leave, before wages."
      />
      <MoneyField name="wagePerHour" label="Wage" per="hour" />
      <NumberField
        name="deskMinutesPerOrder"
        label="Desk time of an order"
        unit="min"
        help="Mail, files, packing and selling."
      />
      <MoneyField name="packingPerOrder" label="Packing" per="order" />
      <MoneyField name="priceStep" label="Prices go in steps of" />
      <DecimalField
        name="benchHoursPerDay"
        label="Bench hours a day"
        unit="h"
        help="All hands together, desk time taken off."
      />
      <RatesFields />
      <Stitch />
      <h2>Starting values of a pattern</h2>
      <DecimalField
        name="rejectPercent"
        label="Rejects"
        unit="%"
        help="Until the shop’s own runs say otherwise."
      />
      <DecimalField
        name="confidencePercent"
        label="How sure a cut count should be"
        unit="%"
        help="That enough good pieces remain."
      />
      <LengthField name="spacingMm" label="Spacing between two cuts" />
      <LengthField name="trimMm" label="Trim at the edges" />
      <DecimalField
        name="areaTolerancePercent"
        label="A side may miss its mark by"
        unit="%"
        help="Measuring by hand and by machine differ. What misses more is said when it comes, and can be claimed. Yours to set."
      />
      <Stitch />
      <h2>Terms</h2>
      <DecimalField
        name="depositPercent"
        label="Deposit asked for"
        unit="%"
        help="0 asks for none."
      />
      <NumberField name="quoteValidDays" label="A quote holds for" unit="days" />
      <NumberField name="paymentTermDays" label="Payment within" unit="days" />
      <TextField name="taxNumber" label="Tax number" short optional />
      <ChargesFields />
      <Stitch />
      <h2>Stock</h2>
      <SelectField
        name="stockValue"
        label="Hardware and supplies are valued by"
        help="A change holds for what moves from then on: what is there that day keeps its worth and goes first. A lot always stands at its own cost."
        choices={stockValueChoices}
      />
      <OrderingFields />
    </Form>
  );
}

/** What the form asks for, from what the shop has now. */
function typedFrom(workshop: Workshop) {
  const { mode: _mode, mailAvailable: _mail, version: _version, ...typed } = workshop;
  return typed;
}
