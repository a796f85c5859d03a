import type { BreakNumbers, RunInput } from '@hidewright/domain';
import { Card } from '../../../../components/card.tsx';
import { KeyFigures } from '../../../../components/key-figures.tsx';
import { areaText, countText, moneyText } from '../../../../lib/formatting.ts';
import { useWorkshop } from '../../../../lib/workshop.tsx';
import { Decimal } from 'decimal.js';

interface LeatherCardProps {
  input: RunInput;
  rung: BreakNumbers;
}

/** The leather that the run takes, per good piece, and what must be bought whole for it. */
export function LeatherCard({ input, rung }: LeatherCardProps) {
  const { areaUnit } = useWorkshop();
  const { boughtWhole: whole } = rung;
  const line = rung.costLines.find(({ kind }) => kind === 'leather');
  const each = new Decimal(rung.leatherAreaMm2).div(rung.quantity).toFixed(3);
  return (
    <Card title="Leather" subtitle={input.leather.name}>
      <KeyFigures
        figures={[
          {
            word: 'the run takes',
            figure: areaText(rung.leatherAreaMm2, areaUnit),
            note: line && moneyText(line.amount),
          },
          {
            word: 'for each good piece',
            figure: areaText(each, areaUnit, 4),
            note: line && moneyText(line.each, 4),
          },
          ...(whole === null
            ? []
            : [
                {
                  word: 'to be bought whole',
                  figure: moneyText(whole.amount),
                  note: `${countText(whole.count)} ${whole.form}${whole.count === 1 ? '' : 's'}, ${areaText(whole.areaMm2, areaUnit)}`,
                },
              ]),
        ]}
      />
      <p className="mt-3 text-sm text-ink-soft">
        {whole === null
          ? 'Say on the leather how large a side of it usually is, and what must be bought whole stands here.'
          : 'The run pays for what it takes; what is left of a side goes back on the rack.'}
      </p>
    </Card>
  );
}
