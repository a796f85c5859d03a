import type { RunNumbers } from '@hidewright/domain';
import { useId } from 'react';
import { classNames } from '../../../lib/class-names.ts';

interface OptionSwitchProps {
  options: readonly { name: string }[];
  /** Null for the piece as it is. */
  chosen: string | null;
  onChoose: (name: string | null) => void;
}

/** Which of the alternatives the numbers are of; nothing where there is only the piece as it is. */
export function OptionSwitch({ options, chosen, onChoose }: OptionSwitchProps) {
  const id = useId();
  if (options.length === 0) return null;
  const all = [
    { name: null, word: 'As it is' },
    ...options.map(({ name }) => ({ name, word: name })),
  ];
  return (
    <fieldset className="mb-3">
      <legend className="sr-only">Numbers of which option</legend>
      <div className="flex flex-wrap gap-1.5">
        {all.map(({ name, word }) => (
          <label
            key={word}
            className={classNames(
              'flex min-h-8 items-center gap-2 rounded border px-3 py-1',
              'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-verdigris',
              name === chosen ? 'border-verdigris bg-verdigris-pale' : 'border-edge bg-card',
            )}
          >
            <input
              type="radio"
              name={id}
              checked={name === chosen}
              onChange={() => onChoose(name)}
              className="size-4 accent-verdigris outline-none"
            />
            {word}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

/** The ladder of one option, or of the piece as it is. */
export function ladderOf(numbers: RunNumbers, option: string | null): RunNumbers {
  const found = numbers.options.find(({ name }) => name === option);
  return found === undefined ? numbers : { ...numbers, breaks: found.breaks };
}
