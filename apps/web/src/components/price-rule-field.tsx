import type { PriceRule } from '@hidewright/domain';
import { useFormContext, useWatch } from 'react-hook-form';
import { DecimalField } from './decimal-field.tsx';
import { describedBy, Field, type FieldLabels } from './field.tsx';
import { MoneyField } from './money-field.tsx';
import { SelectInput } from './select-input.tsx';
import { useField } from './use-field.ts';

type Kind = PriceRule['kind'];

const words: Record<Kind, string> = {
  target: 'reach the target per bench hour',
  margin: 'a margin of the price',
  markup: 'a markup on the cost',
  fixed: 'a fixed sum on top of the cost',
};
const kinds = Object.keys(words) as Kind[];

/** A rule as it is before its figure is typed. */
const begun: Record<Kind, PriceRule> = {
  target: { kind: 'target' },
  margin: { kind: 'margin', percent: '' },
  markup: { kind: 'markup', percent: '' },
  fixed: { kind: 'fixed', amount: '' },
};

interface PriceRuleFieldProps extends Omit<FieldLabels, 'optional'> {
  /** Where the rule stands in the form: `priceRule`, `terms.priceRule`, `breaks.2.rule`. */
  name: string;
  /** Given where no rule of its own is an answer too, which is null: "as the shop usually does". */
  emptyWord?: string | undefined;
}

/** How a price that nobody typed is worked out, and the figure that this takes. */
export function PriceRuleField({ name, emptyWord, ...labels }: PriceRuleFieldProps) {
  const { setValue, clearErrors } = useFormContext();
  const rule = useWatch({ name }) as { kind?: Kind } | null | undefined;
  const whole = useField(name);
  const { id, error = whole.error } = useField(`${name}.kind`);

  function choose(kind: string) {
    const next = kinds.find((each) => each === kind);
    clearErrors(name);
    setValue(name, next === undefined ? null : { ...begun[next] }, { shouldDirty: true });
  }

  return (
    <div className="space-y-3">
      <Field id={id} error={error} {...labels}>
        <SelectInput
          id={id}
          name={`${name}.kind`}
          value={rule?.kind ?? ''}
          onChange={(event) => choose(event.target.value)}
          invalid={error !== undefined}
          aria-describedby={describedBy(id, { help: labels.help, error })}
        >
          {(emptyWord !== undefined || !rule) && (
            <option value="" className="bg-card text-ink">
              {emptyWord ?? 'Choose one'}
            </option>
          )}
          {kinds.map((kind) => (
            <option key={kind} value={kind} className="bg-card text-ink">
              {words[kind]}
            </option>
          ))}
        </SelectInput>
      </Field>
      <Figure key={rule?.kind} name={name} kind={rule?.kind} />
    </div>
  );
}

function Figure({ name, kind }: { name: string; kind: Kind | undefined }) {
  const percent = `${name}.percent`;
  if (kind === 'margin') {
    const help = 'Of the price, left after all costs, tooling aside.';
    return <DecimalField name={percent} label="Margin" unit="%" help={help} />;
  }
  if (kind === 'markup') {
    const help = 'On top of all costs, tooling aside: 100 % doubles them.';
    return <DecimalField name={percent} label="Markup" unit="%" help={help} />;
  }
  if (kind === 'fixed') {
    const help = 'On top of all costs of a piece, tooling aside.';
    return <MoneyField name={`${name}.amount`} label="Sum on top" per="piece" help={help} />;
  }
  return null;
}
