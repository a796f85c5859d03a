import { hardwareUnits, unitWord, type HardwareUnit } from '@hidewright/domain';
import { useWatch } from 'react-hook-form';
import { Checkbox } from '../../../components/checkbox.tsx';
import { More } from '../../../components/more.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';

const names = ['unit', 'metal', 'colour', 'bin', 'fromCustomer'];
const units = hardwareUnits.map((unit) => ({ value: unit, label: unitWord(unit) }));

/** What tells it apart, and where it lies. */
export function WhatItIsFields() {
  const [unit, metal, colour, bin, fromCustomer] = useWatch({ name: names }) as [
    ...[HardwareUnit, string, string, string],
    boolean,
  ];
  const note = [
    unit !== 'piece' && `counted in ${unitWord(unit, 2)}`,
    metal,
    colour,
    bin,
    fromCustomer && 'from the customer',
  ].filter(Boolean);
  return (
    <More word="Metal, colour, place" note={note.join(', ')} names={names}>
      <SelectField name="unit" label="One of it is a" choices={units} whenEmpty="text" short />
      <TextField name="metal" label="Metal" optional />
      <TextField name="colour" label="Colour" optional />
      <TextField name="bin" label="Place" optional help="such as drawer 3, left" />
      <Checkbox
        name="fromCustomer"
        label="The customer brings it"
        help="It is counted and held for jobs, costs nothing, and is never proposed for buying."
      />
    </More>
  );
}
