import { Button } from '../../../components/button.tsx';

interface TagChoice {
  id: number;
  label: string;
  detail: string;
}

interface TagChoicesProps {
  legend: string;
  choices: readonly TagChoice[];
  chosen: readonly number[];
  onChoose: (ids: readonly number[]) => void;
  /** A few of them at once, such as those received today; they join what is chosen. */
  groups: readonly { word: string; ids: readonly number[] }[];
}

/** Which things get a tag. */
export function TagChoices({ legend, choices, chosen, onChoose, groups }: TagChoicesProps) {
  return (
    <fieldset>
      <legend className="mb-2 font-semibold">{legend}</legend>
      <div className="mb-3 flex flex-wrap gap-2">
        {groups
          .filter(({ ids }) => ids.length > 0)
          .map(({ word, ids }) => (
            <Button key={word} onClick={() => onChoose([...new Set([...chosen, ...ids])])}>
              {`${word} (${ids.length})`}
            </Button>
          ))}
        <Button tone="quiet" disabled={chosen.length === 0} onClick={() => onChoose([])}>
          None
        </Button>
      </div>
      <ul className="grid max-h-96 gap-x-6 overflow-y-auto sm:grid-cols-2">
        {choices.map(({ id, label, detail }) => (
          <li key={id}>
            <label className="flex min-h-11 items-center gap-3">
              <input
                type="checkbox"
                checked={chosen.includes(id)}
                onChange={(event) =>
                  onChoose(
                    event.target.checked ? [...chosen, id] : chosen.filter((each) => each !== id),
                  )
                }
                className="size-5 shrink-0 accent-verdigris"
              />
              <span className="min-w-0">
                <span className="font-semibold">{label}</span>{' '}
                <span className="text-ink-soft">{detail}</span>
              </span>
            </label>
          </li>
        ))}
      </ul>
    </fieldset>
  );
}
