import { Checkbox } from '../../../components/checkbox.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { HardwareFields } from './hardware-fields.tsx';
import { LayoutFields } from './layout-fields.tsx';
import { LayoutPreview } from './layout-preview.tsx';
import { LeatherField } from './leather-field.tsx';
import { OptionFields } from './option-fields.tsx';
import { SupplyFields } from './supply-fields.tsx';
import { WorkFields } from './work-fields.tsx';

/** All of a pattern: on a wide screen the drawing stays beside what is typed, on a phone it follows the measures. */
export function PatternFields() {
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,36rem)_minmax(0,1fr)]">
      <div className="space-y-5">
        <TextField name="name" label="Name" help="such as Round coaster" />
        <LayoutFields />
      </div>
      <div className="lg:sticky lg:top-4 lg:col-start-2 lg:row-span-2 lg:row-start-1">
        <LayoutPreview />
      </div>
      <div className="space-y-6">
        <Stitch />
        <LeatherField />
        <HardwareFields />
        <SupplyFields />
        <OptionFields />
        <Stitch />
        <WorkFields />
        <fieldset className="space-y-1">
          <legend className="mb-1 font-semibold">Tooling needed</legend>
          <Checkbox name="definition.needsDie" label="Cutting die" />
          <Checkbox name="definition.needsPlate" label="Stamp plate with the customer’s artwork" />
        </fieldset>
      </div>
    </div>
  );
}
