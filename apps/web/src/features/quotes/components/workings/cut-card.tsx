import { rejectShare, type BreakNumbers, type RunInput } from '@hidewright/domain';
import { Card } from '../../../../components/card.tsx';
import { KeyFigures } from '../../../../components/key-figures.tsx';
import { countText, percentText } from '../../../../lib/formatting.ts';

interface CutCardProps {
  input: RunInput;
  rung: BreakNumbers;
}

const chance = (probability: number) => percentText(String(probability * 100));

/** How many to cut so that enough good ones remain, and what the plain allowance would risk. */
export function CutCard({ input, rung }: CutCardProps) {
  const { fullRows, containers, cutPieces, overs, plain } = rung;
  const noun = `${input.layout.form}${containers === 1 ? '' : 's'}`;
  return (
    <Card title="How many to cut" subtitle={basisWords(input, rung)}>
      <KeyFigures
        figures={[
          {
            word: `for ${countText(rung.quantity)} good ones`,
            figure: countText(rung.cutCount),
            note: `enough in ${chance(rung.probability)} of such runs`,
          },
          ...(fullRows === null
            ? []
            : [
                {
                  word: 'in full rows',
                  figure: countText(fullRows.pieces),
                  note: `${countText(fullRows.rows)} rows, ${countText(fullRows.overs)} over`,
                },
              ]),
          {
            word: `in whole ${input.layout.form}s`,
            figure: countText(cutPieces),
            note: `${countText(containers)} ${noun}, ${countText(overs)} over`,
          },
          {
            word: 'come through all steps',
            figure: chance(1 - rejectShare(input.work)),
            note: 'the rolled yield, seconds among them',
          },
          {
            word: 'plain allowance',
            figure: countText(plain.pieces),
            note: `enough in only ${chance(plain.probability)}`,
          },
          ...(rung.seconds === 0
            ? []
            : [
                {
                  word: 'seconds expected',
                  figure: countText(rung.seconds),
                  note: 'good enough to sell for less',
                },
              ]),
        ]}
      />
      <p className="mt-3 text-sm text-ink-soft">
        Pieces are taken to fail one by one. A die that shifts fails a whole row: look at the first
        row before the rest is struck, and cut more while it is set up.
      </p>
    </Card>
  );
}

function basisWords({ history, confidencePercent }: RunInput, { basis }: BreakNumbers): string {
  const sure = `so that it is enough in ${percentText(confidencePercent)} of runs`;
  return basis === 'history' && history
    ? `${sure}, from ${countText(history.good)} good of ${countText(history.total)} cut before`
    : `${sure}, from the rejects entered`;
}
