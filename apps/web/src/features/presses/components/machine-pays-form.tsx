import type { Workshop } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { FormProvider, useForm, type Resolver } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { useFormDraft } from '../../../components/use-form-draft.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { answerFor, startingMachine, type TypedMachine } from '../typed-machine.ts';

/** The domain's own sentence, at the field that it is about. */
const resolver: Resolver<TypedMachine> = (typed) => {
  const answer = answerFor(typed);
  if ('pays' in answer) return { values: typed, errors: {} };
  return { values: {}, errors: { [answer.field]: { type: 'domain', message: answer.why } } };
};

interface MachinePaysFormProps {
  workshop: Workshop;
  /** The answer, which follows what is typed. */
  children: ReactNode;
}

/** What a press or a die costs and saves. It is answered while it is typed, so there is nothing to send. */
export function MachinePaysForm({ workshop, children }: MachinePaysFormProps) {
  const start = startingMachine(workshop);
  const form = useForm<TypedMachine>({ defaultValues: start, resolver, mode: 'onTouched' });
  const draft = useFormDraft(form, 'machine-pays');
  function startAfresh() {
    form.reset(start);
    draft.forget();
  }
  return (
    <FormProvider {...form}>
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
        <form
          noValidate
          aria-label="The press or the die"
          className="card space-y-5 rounded bg-card p-4 shadow-card sm:p-5"
          onSubmit={(event) => void form.handleSubmit(() => undefined)(event)}
        >
          <MoneyField name="price" label="It costs" help="with carriage and setting up" />
          <DecimalField name="minutesSavedPerRun" label="It saves on a run" unit="min" />
          <DecimalField name="runsPerMonth" label="Runs a month" help="those that would use it" />
          <MoneyField name="hourWorth" label="An hour is worth" help={<HourHelp {...workshop} />} />
          <MoneyField name="upkeepPerYear" label="Upkeep a year" />
          <DecimalField name="years" label="In use for" unit="years" />
          <DecimalField
            name="interestPercent"
            label="Interest a year"
            unit="%"
            help="what the money would cost you, or bring elsewhere"
          />
          <Button onClick={startAfresh}>Start afresh</Button>
        </form>
        {children}
      </div>
    </FormProvider>
  );
}

function HourHelp({ targetPerHour, wagePerHour }: Workshop) {
  if (targetPerHour === undefined || wagePerHour === undefined) {
    return 'what you would do with the hour that is saved';
  }
  return `${moneyText(targetPerHour)} is your target, if you fill the hour with work; ${moneyText(wagePerHour)} is your wage, if you only pay it no longer.`;
}
