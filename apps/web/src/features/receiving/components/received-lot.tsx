import { lotForms, type LotForm } from '@hidewright/contract';
import { get, useFormState, useWatch } from 'react-hook-form';
import { useState } from 'react';
import { AreaField } from '../../../components/area-field.tsx';
import { Button } from '../../../components/button.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { MarkCheck } from './mark-check.tsx';
import { TagField } from './tag-field.tsx';

const forms = lotForms.map((form) => ({ value: form, label: form }));
/** What comes in bundles, cut to a size. */
const cutToSize: readonly LotForm[] = ['panel', 'strip', 'offcut'];

interface ReceivedLotProps {
  at: number;
  /** The line of the order that it belongs to. */
  ordered: { name: string; toCome: string } | undefined;
  leathers: readonly Choice[];
  tolerancePercent: string;
  mayPrice: boolean;
  onRemove: () => void;
}

/** One lot: what must be said of it in sight, the rest behind one press. */
export function ReceivedLot(props: ReceivedLotProps) {
  const { at, ordered, leathers, tolerancePercent, mayPrice, onRemove } = props;
  const lot = `lots.${at}`;
  const form = useWatch({ name: `${lot}.form` }) as LotForm;
  return (
    <div
      role="group"
      aria-label={`Lot ${at + 1}`}
      className="rounded border border-stitch bg-card p-4 shadow-card"
    >
      <div className="mb-3 flex items-start justify-between gap-4">
        <p className="font-semibold">
          {ordered?.name ?? `Lot ${at + 1}`}
          {ordered && (
            <span className="block text-sm font-normal text-ink-soft">{ordered.toCome}</span>
          )}
        </p>
        <Button
          tone="quiet"
          className="-mt-2 -mr-2 min-h-11"
          onClick={onRemove}
          aria-label={`Remove lot ${at + 1}`}
        >
          Remove
        </Button>
      </div>
      <div className="grid items-start gap-x-4 gap-y-3 sm:grid-cols-2">
        {!ordered && (
          <SelectField
            name={`${lot}.leatherId`}
            label="Leather"
            placeholder="Choose a leather"
            choices={leathers}
          />
        )}
        <div className="grid grid-cols-2 gap-x-4 sm:col-span-2">
          <AreaField
            name={`${lot}.markedAreaMm2`}
            label="Marked area"
            optional
            whenEmpty="null"
            help="As stamped on it: 24.75 or 24³."
          />
          <AreaField
            name={`${lot}.measuredAreaMm2`}
            label="Measured area"
            help="As measured here."
          />
        </div>
        <MarkCheck lot={lot} tolerancePercent={tolerancePercent} />
        <SelectField name={`${lot}.form`} label="Form" choices={forms} />
        {cutToSize.includes(form) && (
          <>
            <NumberField name={`${lot}.pieces`} label={`How many in the bundle`} />
            <LengthField name={`${lot}.widthMm`} label="Width of one" optional whenEmpty="null" />
            <LengthField name={`${lot}.heightMm`} label="Height of one" optional whenEmpty="null" />
          </>
        )}
        <TextField name={`${lot}.shade`} label="Shade" optional />
        <TextField name={`${lot}.place`} label="Place" optional />
        <TagField name={`${lot}.tag`} />
      </div>
      <MoreOfLot lot={lot} mayPrice={mayPrice} />
    </div>
  );
}

const furtherFields = ['grade', 'supplierLot', 'cost'];

/** Opens by itself where something in it must be put right. */
function MoreOfLot({ lot, mayPrice }: { lot: string; mayPrice: boolean }) {
  const [asked, setAsked] = useState(false);
  const { errors } = useFormState();
  const wrong = furtherFields.some((field) => get(errors, `${lot}.${field}`) !== undefined);
  const open = asked || wrong;
  return (
    <>
      <Button
        tone="quiet"
        className="mt-2 -ml-3 min-h-11"
        aria-expanded={open}
        onClick={() => setAsked(!open)}
      >
        {open ? 'Less' : mayPrice ? 'Grade, supplier’s lot, cost' : 'Grade, supplier’s lot'}
      </Button>
      {open && (
        <div className="mt-2 grid items-start gap-x-4 gap-y-3 sm:grid-cols-2">
          <TextField name={`${lot}.grade`} label="Grade" optional />
          <TextField name={`${lot}.supplierLot`} label="Supplier’s lot" optional />
          {mayPrice && (
            <MoneyField
              name={`${lot}.cost`}
              label="Cost of the lot"
              optional
              whenEmpty="null"
              help="Left empty, it is the marked area at the price per ft²; without a mark, the measured one."
            />
          )}
        </div>
      )}
    </>
  );
}
