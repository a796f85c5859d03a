import { readSalesSheet } from '@hidewright/contract';
import { Link } from 'react-router-dom';
import { DayField } from '../../../components/day-field.tsx';
import { Form } from '../../../components/form.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { monthPresets } from '../month-presets.ts';

interface Days {
  from: string;
  to: string;
}

interface PeriodPickerProps extends Days {
  onPick: (days: Days) => void;
}

/** Months at one press, or any days; the address tells which. */
export function PeriodPicker({ from, to, onPick }: PeriodPickerProps) {
  const { today } = useWorkshop();
  return (
    <div className="no-print mb-5">
      <nav aria-label="Period">
        <ul className="flex flex-wrap gap-1.5">
          {monthPresets(today).map((preset) => {
            const chosen = preset.from === from && preset.to === to;
            return (
              <li key={preset.word}>
                <Link
                  to={`?from=${preset.from}&to=${preset.to}`}
                  aria-current={chosen ? 'page' : undefined}
                  className={classNames(
                    'block rounded border px-3 py-1 text-sm',
                    chosen
                      ? 'border-verdigris bg-verdigris-pale font-semibold'
                      : 'border-stitch text-ink-soft hover:border-edge hover:text-ink',
                  )}
                >
                  {preset.word}
                </Link>
              </li>
            );
          })}
        </ul>
      </nav>
      <details className="mt-3">
        <summary className="inline-block font-semibold text-verdigris">Other days</summary>
        <div className="mt-3">
          <Form
            key={`${from} ${to}`}
            schema={readSalesSheet.query}
            defaults={{ from, to }}
            submitWord="Show these days"
            submitTone="secondary"
            onSend={async (days) => onPick(days)}
          >
            <div className="flex flex-wrap gap-x-5 gap-y-3">
              <DayField name="from" label="First day" />
              <DayField name="to" label="Last day" />
            </div>
          </Form>
        </div>
      </details>
    </div>
  );
}
