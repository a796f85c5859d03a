import { layOnLot, type BodyInputOf, type LotLayout } from '@hidewright/contract';
import { useState } from 'react';
import { Card } from '../../../components/card.tsx';
import { Form } from '../../../components/form.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { LayoutPicture } from '../../../components/layout-picture.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { areaText, countText, percentText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useLayOnLot, useStartLotSearch } from '../lots.mutations.ts';
import { boxOf } from '../side-sketch.ts';
import { RunningSearch } from './running-search.tsx';
import { cutsFrom, StripsCut } from './strips-cut.tsx';

const searches = [
  { value: 'rows', label: 'In rows', detail: 'which a hand repeats with the die' },
  {
    value: 'strips',
    label: 'In strips for the press',
    detail: 'cut apart first, then the same rows in each strip',
  },
  { value: 'best', label: 'As many as can be found', detail: 'searched for; takes a while' },
];

interface LayOnLotProps {
  lotId: number;
  patterns: readonly { value: number; label: string }[];
}

/** How many pieces of a pattern this very side gives, around its flaws. */
export function LayOnLot({ lotId, patterns }: LayOnLotProps) {
  const send = useLayOnLot();
  const start = useStartLotSearch();
  const [answer, setAnswer] = useState<{ laid: LotLayout } | { searchId: string }>();

  async function lay({ patternId, search }: BodyInputOf<typeof layOnLot>) {
    const params = { id: lotId };
    if (search === 'best') {
      const { id } = await start.mutateAsync({ params, body: { patternId } });
      setAnswer({ searchId: id });
    } else {
      setAnswer({ laid: await send.mutateAsync({ params, body: { patternId, search } }) });
    }
  }

  return (
    <Card title="What it gives" subtitle="pieces of a pattern, clear of edge and flaws">
      <Form
        schema={layOnLot.body}
        defaults={{ patternId: '' as unknown as number, search: 'rows' }}
        submitWord="Lay it out"
        submitTone="secondary"
        onSend={lay}
      >
        <SelectField
          name="patternId"
          label="Pattern"
          placeholder="Choose a pattern"
          choices={patterns}
        />
        <RadioCards name="search" label="How" cards={searches} across />
      </Form>
      {answer && 'laid' in answer && <Laid laid={answer.laid} />}
      {answer && 'searchId' in answer && (
        <RunningSearch key={answer.searchId} id={answer.searchId}>
          {(laid) => <Laid laid={laid} />}
        </RunningSearch>
      )}
    </Card>
  );
}

function Laid({ laid }: { laid: LotLayout }) {
  const { areaUnit } = useWorkshop();
  const { x, y, width, height } = boxOf(laid.side.outline);
  const moved = (point: { x: number; y: number }) => ({ x: point.x - x, y: point.y - y });
  return (
    <div className="mt-5 space-y-4" role="status">
      <LayoutPicture
        title={`${laid.patternName} on ${laid.tag}`}
        outlinePath={laid.outlinePath}
        placements={laid.placements.map((each) => ({ ...each, ...moved(each) }))}
        widthMm={width}
        heightMm={height}
        cuts={laid.cuts ? cutsFrom(laid.cuts, { x, y }) : undefined}
        offcut={laid.offcut && { ...laid.offcut, ...moved(laid.offcut) }}
        side={{
          outline: laid.side.outline.map(moved),
          flaws: laid.side.flaws.map((flaw) => flaw.map(moved)),
        }}
      />
      {laid.cuts && <StripsCut cuts={laid.cuts} />}
      <KeyFigures
        figures={[
          {
            word: 'pieces',
            figure: countText(laid.pieces),
            note:
              laid.boundPieces === null
                ? undefined
                : `no layout gives more than ${countText(laid.boundPieces)}`,
          },
          { word: 'yield', figure: percentText(laid.yieldPercent ?? '0') },
          ...(laid.areaPerPieceMm2 === null
            ? []
            : [
                {
                  word: 'leather for each piece',
                  figure: areaText(laid.areaPerPieceMm2, areaUnit, 4),
                },
              ]),
          ...(laid.piecesInRows === null
            ? []
            : [{ word: 'rows would give', figure: countText(laid.piecesInRows) }]),
        ]}
      />
    </div>
  );
}
