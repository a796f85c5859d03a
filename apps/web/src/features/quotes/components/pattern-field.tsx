import { LinkButton } from '../../../components/link-button.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';

/** What is to be made; what was typed here is still there after a new pattern was made. */
export function PatternField({ choices }: { choices: readonly Choice[] }) {
  return (
    <div className="flex flex-wrap items-start gap-3">
      <div className="min-w-56 grow">
        <SelectField
          name="patternId"
          label="Pattern"
          choices={choices}
          placeholder={choices.length === 0 ? 'None yet: make the first' : 'Choose a pattern'}
        />
      </div>
      <LinkButton to="/pattern-room/patterns/new" className="min-h-10 sm:mt-7">
        New pattern
      </LinkButton>
    </div>
  );
}
