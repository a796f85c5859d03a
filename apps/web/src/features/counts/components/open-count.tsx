import type { BodyInputOf, openCount } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useId, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { SelectInput } from '../../../components/select-input.tsx';
import { whatLies } from '../count-words.ts';
import { useOpenCount } from '../counts.mutations.ts';
import { countPlacesQuery } from '../counts.queries.ts';

type Shelf = BodyInputOf<typeof openCount>;

interface OpenCountProps {
  leathers: readonly { value: string | number; label: string }[];
}

/** What to count: a place with its lots and bins, a leather wherever it hangs, or all that stands in bins. */
export function OpenCount({ leathers }: OpenCountProps) {
  const { data: places } = useSuspenseQuery(countPlacesQuery());
  const open = useOpenCount();
  const navigate = useNavigate();
  const start = (body: Shelf) =>
    open.mutate({ body }, { onSuccess: ({ id }) => void navigate(`/stockroom/counts/${id}`) });
  return (
    <Card title="Count" subtitle="The sheet says what lies there, not how much.">
      {open.error && (
        <Notice tone="danger" live className="mb-4">
          {open.error.message}
        </Notice>
      )}
      <div className="grid gap-5">
        {places.items.length > 0 && (
          <fieldset>
            <legend className="mb-1.5 font-semibold">A place</legend>
            <div className="flex flex-wrap gap-2">
              {places.items.map(({ place, lots, bins }) => (
                <Button
                  key={place}
                  className="min-h-11"
                  busy={open.isPending}
                  onClick={() => start({ of: 'place', place })}
                >
                  {place === '' ? 'No place' : place}
                  <span className="font-normal text-ink-soft">{whatLies(lots, bins)}</span>
                </Button>
              ))}
            </div>
          </fieldset>
        )}
        <fieldset>
          <legend className="mb-1.5 font-semibold">All bins</legend>
          <div className="flex flex-wrap gap-2">
            {(['hardware', 'supplies'] as const).map((of) => (
              <Button key={of} className="min-h-11" onClick={() => start({ of })}>
                {of === 'hardware' ? 'All hardware' : 'All supplies'}
              </Button>
            ))}
          </div>
        </fieldset>
        {leathers.length > 0 && (
          <OneLeather
            leathers={leathers}
            onOpen={(leatherId) => start({ of: 'leather', leatherId })}
          />
        )}
      </div>
    </Card>
  );
}

function OneLeather({
  leathers,
  onOpen,
}: OpenCountProps & { onOpen: (leatherId: number) => void }) {
  const id = useId();
  const [chosen, setChosen] = useState(String(leathers[0]?.value ?? ''));
  return (
    <div>
      <label htmlFor={id} className="mb-1.5 block font-semibold">
        All of a leather
      </label>
      <div className="flex flex-wrap gap-2">
        <div className="min-w-0 grow basis-60">
          <SelectInput id={id} value={chosen} onChange={(event) => setChosen(event.target.value)}>
            {leathers.map(({ value, label }) => (
              <option key={value} value={value} className="bg-card text-ink">
                {label}
              </option>
            ))}
          </SelectInput>
        </div>
        <Button className="min-h-11" onClick={() => onOpen(Number(chosen))}>
          Count it
        </Button>
      </div>
    </div>
  );
}
