import { adviseCut, type CutAdviceReply, type Pattern } from '@hidewright/contract';
import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Form } from '../../../components/form.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { useAdviseCut } from '../patterns.mutations.ts';

/** Panels that are usually sold, in mm: 12 × 12 and 12 × 24 in. Common practice, no source. */
const usual = [
  { widthMm: '304.8', heightMm: '304.8', price: null },
  { widthMm: '304.8', heightMm: '609.6', price: null },
];

interface CutAdviceFormProps {
  pattern: Pattern;
  onAdvice: (advice: CutAdviceReply) => void;
}

/** How many good pieces, and which panels are on offer. */
export function CutAdviceForm({ pattern, onAdvice }: CutAdviceFormProps) {
  const send = useAdviseCut();
  return (
    <Form
      schema={adviseCut.body}
      defaults={{ good: '' as unknown as number, panels: [...ownPanel(pattern), ...usual] }}
      submitWord="Compare"
      draftKey={`cut-from-${pattern.id}`}
      onSend={async (body) =>
        onAdvice(await send.mutateAsync({ params: { id: pattern.id }, body }))
      }
    >
      <NumberField name="good" label="Good pieces needed" whenEmpty="text" />
      <PanelFields />
    </Form>
  );
}

function ownPanel({ definition: { container } }: Pattern) {
  if (container?.form !== 'panel') return [];
  return [{ widthMm: container.widthMm, heightMm: container.heightMm, price: null }];
}

function PanelFields() {
  const { fields, append, remove } = useFieldArray({ name: 'panels' });
  return (
    <fieldset className="min-w-0">
      <legend className="mb-1 font-semibold">Panels on offer</legend>
      <p className="mb-3 text-sm text-ink-soft">
        Without a price a panel is reckoned by the leather’s price for its area.
      </p>
      <div className="space-y-5">
        {fields.map((field, at) => (
          <div
            key={field.id}
            className="grid grid-cols-[minmax(0,1fr)_minmax(0,1fr)_auto] items-start gap-x-3 gap-y-2"
          >
            <LengthField name={`panels.${at}.widthMm`} label="Width" whenEmpty="text" />
            <LengthField name={`panels.${at}.heightMm`} label="Height" whenEmpty="text" />
            <button
              type="button"
              onClick={() => remove(at)}
              aria-label={`Remove panel ${at + 1}`}
              className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
            >
              <X size={18} aria-hidden="true" />
            </button>
            <div className="col-span-2">
              <MoneyField name={`panels.${at}.price`} label="Price" optional whenEmpty="null" />
            </div>
          </div>
        ))}
      </div>
      {fields.length < 8 && (
        <Button
          tone="quiet"
          className="mt-2 -ml-3"
          onClick={() => append({ widthMm: '', heightMm: '', price: null })}
        >
          <Plus size={18} aria-hidden="true" /> Another panel
        </Button>
      )}
    </fieldset>
  );
}
