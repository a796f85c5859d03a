import type { WeekMixReply } from '@hidewright/contract';
import { useEffect, useRef } from 'react';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { Notice } from '../../../components/notice.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { hoursWords, hourWords, incomeWords, largeWords } from '../mix-words.ts';
import { HoursBar } from './hours-bar.tsx';
import { LeftBar } from './left-bar.tsx';
import { MixTable } from './mix-table.tsx';

/** The mix that leaves most, as pictures first. */
export function MixAnswer({ mix, wagePerHour }: { mix: WeekMixReply; wagePerHour: string }) {
  const { currency } = useWorkshop();
  const { income, largePieces, averagePerHour, oneMoreHour } = mix;
  const top = useRef<HTMLDivElement>(null);
  // The button stands below a long list of work; the picture is what was asked for.
  useEffect(() => {
    top.current?.scrollIntoView({ block: 'start' });
  }, [mix]);
  return (
    <div ref={top} className="grid gap-5">
      <Card
        title={income.reached ? 'The income is reached' : 'The income is not reached'}
        subtitle={`the mix that leaves most; amounts in ${currency}, before wages`}
      >
        <HoursBar mix={mix} />
        <LeftBar mix={mix} />
        <div className="mt-5">
          <KeyFigures
            large
            figures={[
              { word: 'left in the week', figure: moneyText(mix.left) },
              {
                word: 'an average hour',
                figure: averagePerHour === null ? '–' : moneyText(averagePerHour),
                note: 'desk time included',
              },
              {
                word: 'one more bench hour',
                figure: moneyText(oneMoreHour.left),
                note: 'not the average one',
              },
              {
                word: 'for large pieces',
                figure: hoursWords(largePieces.atMost ?? largePieces.hours),
                note: income.reached ? 'at most, the income reached' : 'in this mix',
              },
            ]}
          />
        </div>
        <Notice tone={income.reached ? 'info' : 'attention'} live className="mt-5">
          {incomeWords(mix)}
        </Notice>
        <p className="mt-3">{hourWords(mix, wagePerHour)}</p>
        <p className="mt-2">{largeWords(mix)}</p>
      </Card>
      <Card title="The mix" subtitle="a part of a run comes to a whole one over the weeks">
        <MixTable mix={mix} />
      </Card>
    </div>
  );
}
