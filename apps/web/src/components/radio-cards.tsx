import type { ReactNode } from 'react';
import { Controller } from 'react-hook-form';
import { classNames } from '../lib/class-names.ts';
import { describedBy, FieldHelp, type FieldLabels } from './field.tsx';
import { useField } from './use-field.ts';

export interface RadioCard {
  /** Null where "none" is an answer too. */
  value: string | number | null;
  label: ReactNode;
  detail?: ReactNode | undefined;
  /** At the right: a price, or "included". */
  aside?: ReactNode | undefined;
}

interface RadioCardsProps extends FieldLabels {
  name: string;
  cards: readonly RadioCard[];
  /** Side by side where there is room. */
  across?: boolean | undefined;
}

/** One of a few, all in sight. */
export function RadioCards({ name, cards, across, label, help, optional }: RadioCardsProps) {
  const { id, control, error } = useField(name);
  return (
    <fieldset className="max-w-xl" aria-describedby={describedBy(id, { help, error })}>
      <legend className="mb-1 font-semibold">
        {label}
        {optional && <span className="font-normal text-ink-soft"> (optional)</span>}
      </legend>
      <Controller
        name={name}
        control={control}
        render={({ field }) => (
          <div className={classNames('grid gap-1.5', across && 'sm:grid-cols-2')}>
            {cards.map((card, index) => (
              <label key={String(card.value)} className={cardLook(field.value === card.value)}>
                <input
                  id={index === 0 ? id : `${id}-${index}`}
                  ref={index === 0 ? field.ref : undefined}
                  type="radio"
                  name={id}
                  checked={field.value === card.value}
                  onChange={() => field.onChange(card.value)}
                  onBlur={field.onBlur}
                  className="size-4.5 shrink-0 accent-verdigris outline-none"
                />
                <span className="grow">
                  <span className="font-semibold">{card.label}</span>
                  {card.detail && (
                    <span className="block text-sm text-ink-soft">{card.detail}</span>
                  )}
                </span>
                {card.aside && <span className="font-semibold">{card.aside}</span>}
              </label>
            ))}
          </div>
        )}
      />
      <FieldHelp id={id} help={help} error={error} />
    </fieldset>
  );
}

function cardLook(chosen: boolean): string {
  return classNames(
    'flex min-h-11 items-center gap-3 rounded border px-3.5 py-2',
    'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-verdigris',
    chosen ? 'border-verdigris bg-verdigris-pale' : 'border-edge bg-card hover:bg-manila/50',
  );
}
