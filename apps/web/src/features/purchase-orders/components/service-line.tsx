import { X } from 'lucide-react';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { rackAreaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import type { FreeLot, Goods } from '../typed-order.ts';
import { WorkField } from './work-field.tsx';

interface ServiceLineProps {
  at: number;
  lots: readonly FreeLot[];
  leathers: readonly Goods[];
  onRemove: () => void;
}

/** Work on a lot: which, on how much of it, what it becomes, and what it costs. */
export function ServiceLine({ at, lots, leathers, onRemove }: ServiceLineProps) {
  const workshop = useWorkshop();
  const line = `lines.${at}`;
  const lotId: unknown = useWatch({ name: `${line}.lotId` });
  const lot = lots.find(({ id }) => String(id) === String(lotId));
  useSameLeather(line, lot);
  const free = (each: FreeLot) => rackAreaText(each.freeAreaMm2, workshop);
  return (
    <div
      role="group"
      aria-label={`Line ${at + 1}: work on a lot`}
      className="flex flex-wrap items-start gap-x-4 gap-y-2"
    >
      <div className="w-full sm:w-40">
        <WorkField name={`${line}.service`} />
      </div>
      <div className="w-full sm:w-80">
        <SelectField
          name={`${line}.lotId`}
          label="Lot that goes out"
          placeholder="Choose a lot"
          choices={lots.map((each) => ({
            value: each.id,
            label: `${each.tag}, ${each.leatherName}, ${free(each)} free`,
          }))}
        />
      </div>
      <AreaField
        name={`${line}.areaMm2`}
        label="Area"
        optional
        whenEmpty="null"
        help={lot === undefined ? 'Left empty, all that is free.' : `Left empty, all ${free(lot)}.`}
      />
      <div className="w-full sm:w-64">
        <SelectField
          name={`${line}.becomesLeatherId`}
          label="Becomes"
          placeholder="Choose a leather"
          choices={leathers.map(({ id, name }) => ({ value: id, label: name }))}
        />
      </div>
      <MoneyField name={`${line}.unitPrice`} label="Price" per="ft²" optional whenEmpty="null" />
      <MoneyField name={`${line}.fixedPrice`} label="Or for the lot" optional whenEmpty="null" />
      <button
        type="button"
        onClick={onRemove}
        aria-label={`Remove line ${at + 1}`}
        className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
      >
        <X size={18} aria-hidden="true" />
      </button>
    </div>
  );
}

/** Skived leather stays what it is, as long as nobody says otherwise. */
function useSameLeather(line: string, lot: FreeLot | undefined): void {
  const { getValues, setValue } = useFormContext();
  const work: unknown = useWatch({ name: `${line}.service` });
  const leatherId = lot?.leatherId;
  useEffect(() => {
    const chosen: unknown = getValues(`${line}.becomesLeatherId`);
    if (work !== 'skiving' || leatherId === undefined || Number(chosen) > 0) return;
    setValue(`${line}.becomesLeatherId`, leatherId, { shouldDirty: true });
  }, [work, leatherId, line, getValues, setValue]);
}
