import { X } from 'lucide-react';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { AreaPriceField } from '../../../components/area-price-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { rackAreaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import type { FreeLot, Goods } from '../typed-order.ts';
import { WorkField } from './work-field.tsx';

interface ServiceLineProps {
  at: number;
  /** Undefined while they are being read. */
  lots: readonly FreeLot[] | undefined;
  leathers: readonly Goods[];
  onRemove: () => void;
}

/** Work on a lot: which, on how much of it, what it becomes, and what it costs. */
export function ServiceLine({ at, lots, leathers, onRemove }: ServiceLineProps) {
  const line = `lines.${at}`;
  return (
    <div
      role="group"
      aria-label={`Line ${at + 1}: work on a lot`}
      className="max-w-3xl min-w-0 rounded border border-stitch p-4"
    >
      <div className="mb-2 flex items-start justify-between gap-4">
        <p className="text-sm text-ink-soft">
          The lot goes off the rack when the order is sent, and comes back as a new one.
        </p>
        <button
          type="button"
          onClick={onRemove}
          aria-label={`Remove line ${at + 1}`}
          className="-mt-2 -mr-2 grid size-10 shrink-0 place-items-center rounded text-ink-soft hover:bg-manila"
        >
          <X size={18} aria-hidden="true" />
        </button>
      </div>
      <div className="grid grid-cols-1 items-start gap-x-4 gap-y-3 sm:grid-cols-2">
        <div className="min-w-0 space-y-3">
          <WorkField name={`${line}.service`} />
        </div>
        {lots ? <WhatGoesOut line={line} lots={lots} /> : <p>Reading what is on the rack…</p>}
        <SelectField
          name={`${line}.becomesLeatherId`}
          label="Becomes"
          placeholder="Choose a leather"
          choices={leathers.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <div className="flex flex-wrap gap-x-4 gap-y-3 sm:col-span-2">
          <AreaPriceField name={`${line}.unitPrice`} label="Price" optional whenEmpty="null" />
          <MoneyField
            name={`${line}.fixedPrice`}
            label="Or for the lot"
            short
            optional
            whenEmpty="null"
          />
        </div>
      </div>
    </div>
  );
}

/** The lot and how much of it. */
function WhatGoesOut({ line, lots }: { line: string; lots: readonly FreeLot[] }) {
  const workshop = useWorkshop();
  const lotId: unknown = useWatch({ name: `${line}.lotId` });
  const lot = lots.find(({ id }) => String(id) === String(lotId));
  useSameLeather(line, lot);
  const free = (each: FreeLot) => rackAreaText(each.freeAreaMm2, workshop);
  return (
    <>
      <SelectField
        name={`${line}.lotId`}
        label="Lot that goes out"
        placeholder="Choose a lot"
        help={lots.length === 0 ? 'Nothing on the rack is free to go out.' : undefined}
        choices={lots.map((each) => ({
          value: each.id,
          label: `${each.tag}, ${free(each)} free, ${each.leatherName}`,
        }))}
      />
      <AreaField
        name={`${line}.areaMm2`}
        label="Area"
        optional
        whenEmpty="null"
        help={`Left empty, all that is free${lot === undefined ? '' : `: ${free(lot)}`}.`}
      />
    </>
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
