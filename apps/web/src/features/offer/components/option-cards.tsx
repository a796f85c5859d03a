import type { Offer } from '@hidewright/contract';
import { classNames } from '../../../lib/class-names.ts';

interface OptionCardsProps {
  offer: Offer;
  chosen: string | null;
  onChoose: (name: string | null) => void;
}

/** The alternatives of the piece; nothing where there is only one. */
export function OptionCards({ offer, chosen, onChoose }: OptionCardsProps) {
  if (offer.options.length === 0) return null;
  const all = [
    { name: null, word: 'As shown' },
    ...offer.options.map(({ name }) => ({ name, word: name })),
  ];
  return (
    <fieldset>
      <legend className="mb-1.5 font-semibold">Which one?</legend>
      <div className="grid gap-1.5">
        {all.map(({ name, word }) => (
          <label
            key={word}
            className={classNames(
              'flex min-h-12 items-center gap-3 rounded border px-3.5 py-2',
              'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-verdigris',
              name === chosen
                ? 'border-verdigris bg-verdigris-pale'
                : 'border-stitch bg-card hover:border-edge',
            )}
          >
            <input
              type="radio"
              name="option"
              checked={name === chosen}
              onChange={() => onChoose(name)}
              className="size-4.5 shrink-0 accent-verdigris outline-none"
            />
            <span className="font-semibold">{word}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
