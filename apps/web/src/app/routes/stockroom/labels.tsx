import type { Lot } from '@hidewright/contract';
import { printLabels } from '@hidewright/contract';
import { binTag } from '@hidewright/domain';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { buttonLook } from '../../../components/button-look.ts';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { hardwareListQuery } from '../../../features/hardware/hardware.queries.ts';
import { SheetMeasuresFields } from '../../../features/labels/components/sheet-measures.tsx';
import { TagChoices } from '../../../features/labels/components/tag-choices.tsx';
import { askFor, plainGrids, type SheetMeasures } from '../../../features/labels/label-choice.ts';
import { lotsQuery } from '../../../features/lots/lots.queries.ts';
import { addressOf } from '../../../lib/api.ts';
import { readDraft, writeDraft } from '../../../lib/draft.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { StockroomNav } from './stockroom-nav.tsx';

const onRack = { onRack: 'yes' as const };

export async function loader() {
  await Promise.all([
    queryClient.ensureInfiniteQueryData(lotsQuery(onRack)),
    queryClient.ensureQueryData(hardwareListQuery()),
  ]);
  return null;
}

const idsIn = (search: URLSearchParams, name: string): number[] =>
  (search.get(name) ?? '')
    .split(',')
    .map(Number)
    .filter((each) => each > 0);

const measuresKey = 'label-measures';

export function Component() {
  const [search] = useSearchParams();
  const [lots, setLots] = useState<readonly number[]>(() => idsIn(search, 'lots'));
  const [hardware, setHardware] = useState<readonly number[]>(() => idsIn(search, 'hardware'));
  const [measures, setMeasures] = useState<SheetMeasures>(() => ({
    ...(plainGrids[0]?.measures as SheetMeasures),
    ...(readDraft(measuresKey) as Partial<SheetMeasures> | undefined),
  }));
  const asked = askFor(lots, hardware, measures);
  return (
    <>
      <PageHeader title="Tags" subtitle="With a code that a phone or a hand scanner opens" />
      <StockroomNav />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        <div className="grid gap-5">
          <Card>
            <LotTags chosen={lots} onChoose={setLots} />
          </Card>
          <Card>
            <BinTags chosen={hardware} onChoose={setHardware} />
          </Card>
        </div>
        <Card title="The sheet">
          <SheetMeasuresFields
            measures={measures}
            onChange={(next) => {
              setMeasures(next);
              writeDraft(measuresKey, next);
            }}
          />
          <p role="status" className="mt-5 mb-2 font-semibold">
            {'wrong' in asked ? asked.wrong : tagsWord(lots.length + hardware.length)}
          </p>
          {'query' in asked && (
            <a
              href={addressOf(printLabels, { query: asked.query as never })}
              download
              className={`${buttonLook({ tone: 'primary' })} min-h-11`}
            >
              Get the PDF
            </a>
          )}
          <p className="mt-3 text-sm text-ink-soft">
            Print it at its true size: no scaling, no fitting to the page.
          </p>
        </Card>
      </div>
    </>
  );
}

const tagsWord = (count: number): string => (count === 1 ? '1 tag' : `${count} tags`);

interface ChosenProps {
  chosen: readonly number[];
  onChoose: (ids: readonly number[]) => void;
}

function LotTags({ chosen, onChoose }: ChosenProps) {
  const { today } = useWorkshop();
  const { data, hasNextPage, fetchNextPage } = useInfiniteQuery(lotsQuery(onRack));
  const all: Lot[] = data?.pages.flatMap((page) => page.items) ?? [];
  const idsOf = (some: readonly Lot[]) => some.map(({ id }) => id);
  const leathers = [...new Set(all.map(({ leatherName }) => leatherName))].sort();
  return (
    <>
      <TagChoices
        legend="Lots on the rack"
        choices={all.map(({ id, tag, leatherName, form }) => ({
          id,
          label: tag,
          detail: `${leatherName}, ${form}`,
        }))}
        chosen={chosen}
        onChoose={onChoose}
        groups={[
          { word: 'Received today', ids: idsOf(all.filter((lot) => lot.receivedOn === today)) },
          ...leathers.map((name) => ({
            word: name,
            ids: idsOf(all.filter((lot) => lot.leatherName === name)),
          })),
        ]}
      />
      {hasNextPage && (
        <Button className="mt-3" onClick={() => void fetchNextPage()}>
          Show earlier lots
        </Button>
      )}
    </>
  );
}

function BinTags({ chosen, onChoose }: ChosenProps) {
  const { data } = useSuspenseQuery(hardwareListQuery());
  const bins = data.items.filter(({ active }) => active);
  return (
    <TagChoices
      legend="Bins"
      choices={bins.map(({ id, name }) => ({ id, label: binTag(id), detail: name }))}
      chosen={chosen}
      onChoose={onChoose}
      groups={[{ word: 'All', ids: bins.map(({ id }) => id) }]}
    />
  );
}

export const ErrorBoundary = RouteError;
