import type { PurchaseLine } from '@hidewright/contract';
import { countedWords, unitWord } from '@hidewright/domain';
import { Plus } from 'lucide-react';
import { useEffect } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { WeighCount } from '../../../components/weigh-count.tsx';
import { useFocusKept } from '../../../components/use-focus-kept.ts';
import { ReceivedLegend } from './received-legend.tsx';
import { blankHardware, isOpen, type TypedHardware } from '../typed-delivery.ts';

interface ReceivedHardwareListProps {
  lines: readonly PurchaseLine[];
  hardware: readonly Choice[];
  /** Those among it that customers bring, which cost nothing. */
  fromCustomer: readonly number[];
  mayPrice: boolean;
}

/** The hardware and supplies that came, counted; of an order, what is still to come stands there already. */
export function ReceivedHardwareList(props: ReceivedHardwareListProps) {
  const { lines, hardware, fromCustomer, mayPrice } = props;
  const { fields, append, remove } = useFieldArray<{ hardware: TypedHardware[] }>({
    name: 'hardware',
  });
  const { list, keepFocus } = useFocusKept<HTMLFieldSetElement>();
  const left = lines.filter(
    (line) =>
      line.of === 'hardware' &&
      isOpen(line) &&
      !fields.some((row) => row.purchaseLineId === line.id),
  );
  const aside = lines.length > 0 && left.length === 0 && fields.length === 0;
  return (
    <fieldset ref={list} tabIndex={-1}>
      <ReceivedLegend aside={aside}>Hardware and supplies</ReceivedLegend>
      <div className="space-y-4">
        {fields.map((field, at) => (
          <ReceivedHardware
            key={field.id}
            at={at}
            line={lines.find(({ id }) => id === field.purchaseLineId)}
            hardware={hardware}
            fromCustomer={fromCustomer}
            mayPrice={mayPrice}
            onRemove={() => {
              remove(at);
              keepFocus();
            }}
          />
        ))}
      </div>
      <div className="mt-3 flex flex-wrap gap-2">
        {left.map((line) => (
          <Button
            key={line.id}
            className="min-h-11"
            onClick={() =>
              append(blankHardware(line.hardwareId ?? undefined, line.id, restOf(line)))
            }
          >
            <Plus size={18} aria-hidden="true" /> {line.name}
          </Button>
        ))}
        <Button
          className="min-h-11"
          tone={lines.length === 0 ? 'secondary' : 'quiet'}
          onClick={() =>
            append(blankHardware(undefined, null), {
              focusName: `hardware.${fields.length}.hardwareId`,
            })
          }
        >
          <Plus size={18} aria-hidden="true" />
          {lines.length === 0 ? 'Hardware or supplies' : 'Other hardware came with it'}
        </Button>
      </div>
    </fieldset>
  );
}

const restOf = (line: PurchaseLine) => line.toCome.quantity ?? undefined;

interface ReceivedHardwareProps {
  at: number;
  line: PurchaseLine | undefined;
  hardware: readonly Choice[];
  fromCustomer: readonly number[];
  mayPrice: boolean;
  onRemove: () => void;
}

function ReceivedHardware(props: ReceivedHardwareProps) {
  const { at, line, hardware, fromCustomer, mayPrice, onRemove } = props;
  const row = `hardware.${at}`;
  const { setValue } = useFormContext();
  return (
    <div
      role="group"
      aria-label={line?.name ?? `Hardware ${at + 1}`}
      className="rounded border border-stitch bg-card p-4 shadow-card"
    >
      <div className="mb-3 flex items-start justify-between gap-4">
        <p className="font-semibold">
          {line?.name ?? `Hardware ${at + 1}`}
          {line && (
            <span className="block text-sm font-normal text-ink-soft">
              {countedWords(restOf(line) ?? 0, line.unit ?? 'piece')} to come
            </span>
          )}
        </p>
        <Button
          tone="quiet"
          className="-mt-2 -mr-2 min-h-11"
          onClick={onRemove}
          aria-label={line ? `Did not come: ${line.name}` : `Remove hardware ${at + 1}`}
        >
          {line ? 'Did not come' : 'Remove'}
        </Button>
      </div>
      <div className="grid items-start gap-x-4 gap-y-3 sm:grid-cols-2">
        {!line && (
          <SelectField
            name={`${row}.hardwareId`}
            label="Hardware or supplies"
            placeholder="Choose one"
            choices={hardware}
          />
        )}
        <NumberField
          name={`${row}.quantity`}
          label="Came"
          unit={line?.unit && unitWord(line.unit, 2)}
        />
        {(!line || line.unit === 'piece') && (
          <WeighCount
            of={line?.name ?? `Hardware ${at + 1}`}
            onCount={(count) =>
              setValue(`${row}.quantity`, count, { shouldDirty: true, shouldValidate: true })
            }
          />
        )}
        <TextField name={`${row}.batch`} label="Batch" optional help="As printed on the bag." />
        {mayPrice && <CostField row={row} fromCustomer={fromCustomer} />}
      </div>
    </div>
  );
}

/** What the customer brings has no cost to be typed, nor keeps one from before it was chosen. */
function CostField({ row, fromCustomer }: { row: string; fromCustomer: readonly number[] }) {
  const { setValue } = useFormContext();
  const theirs = fromCustomer.includes(Number(useWatch({ name: `${row}.hardwareId` })));
  useEffect(() => {
    if (theirs) setValue(`${row}.cost`, null);
  }, [theirs, row, setValue]);
  if (theirs) return <p className="text-ink-soft">The customer brings it: it costs nothing.</p>;
  return (
    <MoneyField
      name={`${row}.cost`}
      label="Cost of all"
      optional
      whenEmpty="null"
      help="Left empty, it is worked out from the price."
    />
  );
}
