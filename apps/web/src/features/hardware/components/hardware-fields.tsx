import type { Hardware } from '@hidewright/contract';
import { kitWords, unitWord, type HardwareUnit } from '@hidewright/domain';
import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { hardwareListQuery } from '../hardware.queries.ts';
import { KitFields } from './kit-fields.tsx';
import { SettingFields } from './setting-fields.tsx';
import { StandInFields } from './stand-in-fields.tsx';
import { WhatItIsFields } from './what-it-is-fields.tsx';

const kinds = [
  { value: 'hardware', label: 'Hardware', detail: 'rivets, snaps, rings' },
  { value: 'supplies', label: 'Supplies', detail: 'thread, dye, boxes' },
];

interface HardwareFieldsProps {
  suppliers: readonly Choice[];
  /** The hardware itself, which is no part of its own. */
  own?: number | undefined;
}

export function HardwareFields({ suppliers, own }: HardwareFieldsProps) {
  const parts = useWatch({ name: 'parts' }) as unknown[] | undefined;
  const isKit = (parts?.length ?? 0) > 0;
  const unit = useWatch({ name: 'unit' }) as HardwareUnit | undefined;
  const others = useOtherHardware(own);
  return (
    <>
      <RadioCards name="kind" label="Kind" cards={kinds} across />
      <TextField name="name" label="Name" help="such as Copper rivet 9 mm" />
      <PriceField isKit={isKit} />
      {!isKit && (
        <>
          <NumberField name="packSize" label="In packs of" unit={unitWord(unit ?? 'piece', 2)} />
          <NumberField
            name="reorderAt"
            label="Keep at least"
            unit="free"
            help="Below that, with what is on order counted in, it shows as short."
          />
          {suppliers.length > 0 && (
            <SelectField
              name="supplierId"
              label="Supplier"
              optional
              placeholder="None yet"
              whenEmpty="null"
              choices={suppliers}
            />
          )}
        </>
      )}
      <WhatItIsFields />
      <SettingFields />
      <KitFields choices={choicesAmong(others.filter(({ parts: its }) => its.length === 0))} />
      <StandInFields choices={choicesAmong(others)} />
    </>
  );
}

/** A kit whose price is that of its parts has none to be typed, nor has what the customer brings. */
function PriceField({ isKit }: { isKit: boolean }) {
  const { getValues, setValue } = useFormContext();
  const fromParts = useWatch({ name: 'priceFromParts' }) as boolean | undefined;
  const unit = useWatch({ name: 'unit' }) as HardwareUnit | undefined;
  const fromCustomer = useWatch({ name: 'fromCustomer' }) as boolean | undefined;
  const hidden = fromCustomer === true || (isKit && fromParts === true);
  useEffect(() => {
    if (hidden && getValues('unitPrice') === '') setValue('unitPrice', '0');
  }, [hidden, getValues, setValue]);
  return hidden ? null : (
    <MoneyField name="unitPrice" label="Price" per={unitWord(unit ?? 'piece')} />
  );
}

function useOtherHardware(own: number | undefined): Hardware[] {
  const { data } = useQuery(hardwareListQuery());
  return (data?.items ?? [])
    .filter(({ id, active }) => active && id !== own)
    .sort((a, b) => a.name.localeCompare(b.name, 'en'));
}

const choicesAmong = (hardware: readonly Hardware[]): Choice[] =>
  hardware.map(({ id, name, parts }) => ({
    value: id,
    label: parts.length > 0 ? `${name}, ${kitWords(parts)}` : name,
  }));
