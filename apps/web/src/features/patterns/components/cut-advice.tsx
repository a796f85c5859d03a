import type { CutAdviceReply } from '@hidewright/contract';
import { useMemo } from 'react';
import { Card } from '../../../components/card.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { areaText, countText, lengthText, moneyText, sizeText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';

type Row = CutAdviceReply['rows'][number];

/** What each leather costs for the run, the cheapest marked, and the lots to take. */
export function CutAdvice({ advice }: { advice: CutAdviceReply }) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop), [workshop]);
  return (
    <div className="grid gap-5">
      <Card
        title="Compared"
        subtitle={`${countText(advice.good)} good pieces: cut ${countText(advice.cut)}`}
      >
        <DataTable
          label="What the run can be cut from"
          rows={advice.rows}
          rowId={(row) => advice.rows.indexOf(row)}
          columns={columns}
          empty={
            <p className="text-ink-soft">Nothing to compare: name a panel that is on offer.</p>
          }
        />
        <p className="mt-3 text-sm text-ink-soft">
          The whole price is what must be bought or taken; the share is for the leather that the run
          uses of it. Strips are priced by their area.
        </p>
      </Card>
      <Card title="From the rack" subtitle="one order from one lot where it can">
        <Rack rack={advice.rack} />
      </Card>
    </div>
  );
}

function Rack({ rack }: Pick<CutAdviceReply, 'rack'>) {
  if (rack === null) {
    return <p className="text-ink-soft">The lots on the rack do not give enough together.</p>;
  }
  return (
    <ul className="space-y-1">
      {rack.map(({ lotId, tag, pieces }) => (
        <li key={lotId}>
          Take <TextLink to={`/stockroom/lots/${lotId}`}>{tag}</TextLink>
          {`, which gives about ${countText(pieces)}.`}
        </li>
      ))}
    </ul>
  );
}

function columnsFor({ lengthUnit, areaUnit, currency }: Workshop): Column<Row>[] {
  const orDash = (text: string | null, show: (text: string) => string) =>
    text === null ? '–' : show(text);
  return [
    {
      id: 'from',
      header: 'From',
      value: (row) => wordsOf(row, lengthUnit),
      cell: (row) => (
        <span className="block text-left">
          {wordsOf(row, lengthUnit)}
          {row.cheapest && <StateMark state="in use">cheapest</StateMark>}
        </span>
      ),
      onPhone: 'title',
    },
    {
      id: 'pieces',
      header: 'Gives',
      value: (row) => row.pieces,
      cell: (row) => givesWords(row, lengthUnit),
      align: 'right',
    },
    {
      id: 'needed',
      header: 'Needed',
      value: (row) => row.needed,
      cell: (row) => neededWords(row, lengthUnit),
      align: 'right',
    },
    {
      id: 'whole',
      header: `Whole, ${currency}`,
      value: (row) => row.wholePrice,
      cell: (row) => orDash(row.wholePrice, moneyText),
      align: 'right',
    },
    {
      id: 'share',
      header: `Share, ${currency}`,
      value: (row) => row.sharePrice,
      cell: (row) => orDash(row.sharePrice, moneyText),
      align: 'right',
    },
    {
      id: 'each',
      header: 'Whole, each',
      value: (row) => row.perGoodPiece,
      cell: (row) => orDash(row.perGoodPiece, (price) => Number(price).toFixed(3)),
      align: 'right',
    },
    {
      id: 'area',
      header: 'Leather, each',
      value: (row) => row.areaPerGoodMm2,
      cell: (row) => orDash(row.areaPerGoodMm2, (area) => areaText(area, areaUnit, 4)),
      align: 'right',
    },
    {
      id: 'back',
      header: 'Goes back',
      value: (row) => row.offcut?.widthMm,
      cell: (row) =>
        row.offcut ? sizeText(row.offcut.widthMm, row.offcut.heightMm, lengthUnit) : '–',
      align: 'right',
    },
  ];
}

function wordsOf(row: Row, unit: Workshop['lengthUnit']): string {
  if (row.kind === 'lot') {
    const strips = row.stripsMm === null ? '' : `, ${inStrips(row.stripsMm, unit)}`;
    return `Lot ${row.tag}${strips}`;
  }
  if (row.kind === 'strip') return `Strip, ${lengthText(row.widthMm ?? '0', unit)} wide`;
  return `Panel, ${sizeText(row.widthMm ?? '0', row.heightMm ?? '0', unit)}`;
}

const inStrips = (widestMm: string, unit: Workshop['lengthUnit']): string =>
  `in strips for the press, at most ${lengthText(widestMm, unit)} wide`;

/** From one panel or lot; of a strip how many come again after how much. */
function givesWords(row: Row, unit: Workshop['lengthUnit']): string {
  const pieces = countText(row.pieces);
  if (row.repeatMm !== null) return `${pieces} per ${lengthText(row.repeatMm, unit)}`;
  return row.estimated ? `about ${pieces}` : pieces;
}

function neededWords(row: Row, unit: Workshop['lengthUnit']): string {
  if (row.needed === null) return row.pieces === 0 ? 'nothing fits' : 'not enough';
  return row.lengthMm === null ? countText(row.needed) : lengthText(row.lengthMm, unit);
}
