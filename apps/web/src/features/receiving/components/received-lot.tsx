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
import { WeightField } from '../../../components/weight-field.tsx';
import { MarkCheck } from './mark-check.tsx';
import { SizeCheck } from './size-check.tsx';
import { TagField } from './tag-field.tsx';

const forms = lotForms.map((form) => ({ value: form, label: form }));
/** What comes in bundles, cut to a size. */
const cutToSize: readonly LotForm[] = ['panel', 'strip', 'offcut'];

interface ReceivedLotProps {
  at: number;
  /** The line of the order that it belongs to. */
  ordered: { name: string; toCome: string; isWork: boolean } | undefined;
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
  const isWork = ordered?.isWork ?? false;
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
        {(!ordered || isWork) && (
          <SelectField
            name={`${lot}.leatherId`}
            label={isWork ? 'It is now' : 'Leather'}
            placeholder="Choose a leather"
            choices={leathers}
          />
        )}
        {isWork ? (
          <AreaField
            name={`${lot}.measuredAreaMm2`}
            label="Measured area"
            help="As it went out: measure it anew."
          />
        ) : (
          <Areas lot={lot} tolerancePercent={tolerancePercent} hasOrder={ordered !== undefined} />
        )}
        <SelectField name={`${lot}.form`} label="Form" choices={forms} />
        {cutToSize.includes(form) && (
          <>
            <NumberField name={`${lot}.pieces`} label={`How many in the bundle`} />
            <LengthField name={`${lot}.widthMm`} label="Width of one" optional whenEmpty="null" />
            <LengthField name={`${lot}.heightMm`} label="Height of one" optional whenEmpty="null" />
            <SizeCheck lot={lot} />
          </>
        )}
        <TextField name={`${lot}.shade`} label="Shade" optional />
        <TextField name={`${lot}.place`} label="Place" optional />
        <TagField name={`${lot}.tag`} />
      </div>
      {isWork && (
        <p className="mt-3 max-w-prose text-sm text-ink-soft">
          Look it over for flaws again: the drawing and photo stay with the lot that went out. Hang
          a new tag on it.
        </p>
      )}
      <MoreOfLot lot={lot} mayPrice={mayPrice} isWork={isWork} />
    </div>
  );
}

interface AreasProps {
  lot: string;
  tolerancePercent: string;
  hasOrder: boolean;
}

/** As it is stamped on, and as it is measured here. */
function Areas({ lot, tolerancePercent, hasOrder }: AreasProps) {
  return (
    <>
      <div className="grid grid-cols-2 gap-x-4 sm:col-span-2">
        <AreaField
          name={`${lot}.markedAreaMm2`}
          label="Marked area"
          optional
          whenEmpty="null"
          help={(examples) => `As stamped on it: ${examples}.`}
        />
        <AreaField name={`${lot}.measuredAreaMm2`} label="Measured area" help="As measured here." />
      </div>
      <MarkCheck lot={lot} tolerancePercent={tolerancePercent} hasOrder={hasOrder} />
    </>
  );
}

const furtherFields = ['weightOz', 'grade', 'supplierLot', 'cost'];

interface MoreOfLotProps {
  lot: string;
  mayPrice: boolean;
  isWork: boolean;
}

/** Opens by itself where something in it must be put right. */
function MoreOfLot({ lot, mayPrice, isWork }: MoreOfLotProps) {
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
        {open
          ? 'Less'
          : mayPrice
            ? 'Weight, grade, supplier’s lot, cost'
            : 'Weight, grade, supplier’s lot'}
      </Button>
      {open && (
        <div className="mt-2 grid items-start gap-x-4 gap-y-3 sm:grid-cols-2">
          <WeightField
            name={`${lot}.weightOz`}
            label="Weight"
            help="or as thick as it is: 2.4 mm"
          />
          <TextField name={`${lot}.grade`} label="Grade" optional />
          <TextField
            name={`${lot}.supplierLot`}
            label="Supplier’s lot"
            optional
            help={isWork ? 'Left empty, that of the lot that went out.' : undefined}
          />
          {mayPrice && (
            <MoneyField
              name={`${lot}.cost`}
              label={isWork ? 'Cost of the work' : 'Cost of the lot'}
              optional
              whenEmpty="null"
              help={
                isWork
                  ? 'Left empty, it is its share of the price on the order.'
                  : 'Left empty, it is the marked area at its price; without a mark, the measured one.'
              }
            />
          )}
        </div>
      )}
    </>
  );
}
