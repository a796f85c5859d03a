import {
  hourlyKinds,
  type BreakNumbers,
  type CostKind,
  type CostLine,
  type RunInput,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { useState } from 'react';
import { Card } from '../../../components/card.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { Waterfall, type WaterfallLine } from '../../../components/waterfall.tsx';
import { countText, moneyText, numberText } from '../../../lib/formatting.ts';

interface OnePieceCardProps {
  rung: BreakNumbers;
  tooling: RunInput['tooling'];
}

/** Where the price of one piece goes; tooling stands below, in lines of its own. */
export function OnePieceCard({ rung, tooling }: OnePieceCardProps) {
  const [opened, setOpened] = useState<CostKind>();
  const lines = linesOf(rung, (kind) => setOpened(kind === opened ? undefined : kind));
  const workings = rung.costLines.filter((line) => line.kind === opened);
  return (
    <Card
      title={`One piece at ${countText(rung.quantity)}`}
      subtitle="press a line for its workings"
    >
      <Waterfall
        label={`From the price of one piece at ${countText(rung.quantity)} to what is left`}
        lines={lines}
      />
      <div role="status" className="text-sm text-ink-soft">
        {workings.map((line) => (
          <p key={line.name} className="mt-1.5">
            <span className="font-semibold text-ink">{line.name}</span>
            {`: ${line.workings} = ${moneyText(line.amount)} for the run`}
          </p>
        ))}
      </div>
      {tooling.length > 0 && (
        <>
          <Stitch className="my-4" />
          <ToolingTable tooling={tooling} />
        </>
      )}
    </Card>
  );
}

const words: [CostKind, string][] = [
  ['leather', 'leather'],
  ['hardware', 'hardware'],
  ['supplies', 'supplies'],
  ['packing', 'packing'],
  ['carriage', 'carriage'],
  ['fees', 'card fees'],
  ['wages', 'wages'],
  ['desk', 'desk time'],
  ['overhead', 'overhead'],
];

function linesOf(rung: BreakNumbers, onOpen: (kind: CostKind) => void): WaterfallLine[] {
  const costs = words.flatMap(([kind, word]): WaterfallLine[] => {
    const amount = eachOf(rung.costLines, kind, rung.quantity);
    if (amount === undefined) return [];
    const label = kind === 'wages' ? `${word}, ${minutesEach(rung)} min` : word;
    const isWork = hourlyKinds.includes(kind);
    return [{ label, amount, kind: isWork ? 'work' : 'bought', onOpen: () => onOpen(kind) }];
  });
  const once = rung.charges.reduce((sum, { amount }) => sum.plus(amount), new Decimal(0));
  const price = once.div(rung.quantity).plus(rung.priceEach);
  const left = costs.reduce((rest, line) => rest.minus(line.amount), price);
  const word = once.isZero() ? 'price' : 'price, charges shared';
  return [
    { label: word, amount: price.toFixed(4), kind: 'price' },
    ...costs,
    { label: 'left', amount: left.toFixed(4), kind: 'left' },
  ];
}

/** A kind of cost over the pieces ordered; undefined where the run has none of it. */
function eachOf(lines: readonly CostLine[], kind: CostKind, quantity: number): string | undefined {
  const sum = lines
    .filter((line) => line.kind === kind)
    .reduce((total, line) => total.plus(line.amount), new Decimal(0));
  return sum.isZero() ? undefined : sum.div(quantity).toFixed(4);
}

const minutesEach = (rung: BreakNumbers) =>
  numberText(new Decimal(rung.benchMinutes).div(rung.quantity).toFixed(4), 1);

function ToolingTable({ tooling }: Pick<OnePieceCardProps, 'tooling'>) {
  return (
    <table className="w-full" aria-label="Tooling, charged once">
      <thead className="text-sm text-ink-soft">
        <tr>
          <th scope="col" className="text-left font-normal">
            tooling, once
          </th>
          <th scope="col" className="text-right font-normal">
            costs
          </th>
          <th scope="col" className="text-right font-normal">
            charged
          </th>
        </tr>
      </thead>
      <tbody>
        {tooling.map((tool, at) => (
          <tr key={`${at} ${tool.name}`}>
            <th scope="row" className="py-1 text-left font-normal">
              {tool.name}
            </th>
            <td className="text-right">{moneyText(tool.cost)}</td>
            <td className="text-right font-semibold">{moneyText(tool.charge)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
