import { useWatch } from 'react-hook-form';
import { Checkbox } from '../../../components/checkbox.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { More } from '../../../components/more.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { lengthText } from '../../../lib/formatting.ts';
import { isFigure } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

const names = ['postLengthMm', 'stackMinMm', 'stackMaxMm', 'settingDie', 'settingDieHere'];

/** How it is set: what goes through the leather, and with which die. */
export function SettingFields() {
  const { lengthUnit } = useWorkshop();
  const [post, , , die] = useWatch({ name: names }) as (string | null)[];
  const note = [
    post && isFigure(post) ? `post ${lengthText(post, lengthUnit)}` : '',
    die ? `die ${die}` : '',
  ].filter(Boolean);
  return (
    <More word="How it is set" note={note.join(', ')} names={names}>
      <p className="text-sm text-ink-soft">
        With these a pattern says when the post does not suit its folded leather.
      </p>
      <LengthField name="postLengthMm" label="Length of the post" optional whenEmpty="null" />
      <fieldset>
        <legend className="sr-only">Stack that it holds</legend>
        <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
          <LengthField name="stackMinMm" label="Holds a stack from" optional whenEmpty="null" />
          <LengthField name="stackMaxMm" label="to" optional whenEmpty="null" />
        </div>
      </fieldset>
      <TextField
        name="settingDie"
        label="Setting die"
        optional
        help="the name or number that you give it"
      />
      <Checkbox name="settingDieHere" label="That die is in the shop" />
    </More>
  );
}
