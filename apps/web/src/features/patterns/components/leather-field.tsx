import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { areaPriceText } from '../../../lib/formatting.ts';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { leatherChoicesQuery } from '../patterns.queries.ts';
import { AddLeatherDialog } from './add-leather-dialog.tsx';

const name = 'definition.leatherId';

/** The leather it is made of: chosen, or added in place. */
export function LeatherField() {
  const { setValue, clearErrors } = useFormContext();
  const { areaUnit, currency } = useWorkshop();
  const { data: leathers = [] } = useQuery(leatherChoicesQuery());
  const [adding, setAdding] = useState(false);
  const choose = (id: number) => {
    setValue(name, id, { shouldDirty: true });
    clearErrors(name);
  };
  const chosen = Number(useWatch({ name }));
  const leather = leathers.find(({ id }) => id === chosen);
  const price =
    leather?.pricePerFt2 === undefined
      ? ''
      : `${areaPriceText(leather.pricePerFt2, areaUnit)} ${currency} per ${areaUnits[areaUnit].sign}`;
  return (
    <div>
      {/* A new list is a new field: a chosen leather must stand among its choices before it can be shown. */}
      <SelectField
        key={leathers.map(({ id }) => id).join()}
        name={name}
        label="Leather"
        help={leathers.length === 0 ? 'None is there yet: add the first one.' : price}
        placeholder="Choose a leather"
        whenEmpty="text"
        choices={leathers.map(({ id, name: label }) => ({ value: id, label }))}
      />
      <Button tone="quiet" className="mt-1 -ml-3" onClick={() => setAdding(true)}>
        <Plus size={18} aria-hidden="true" /> Another leather
      </Button>
      <More word="More leather than the layout" names={['definition.leatherExtraPercent']}>
        <DecimalField
          name="definition.leatherExtraPercent"
          label="On top of the layout"
          unit="%"
          optional
          help="For flaws and what is cut away around them; runs that are finished say how much it was."
        />
      </More>
      <AddLeatherDialog open={adding} onOpenChange={setAdding} onAdded={({ id }) => choose(id)} />
    </div>
  );
}
