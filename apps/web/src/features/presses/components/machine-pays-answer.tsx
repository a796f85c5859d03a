import type { MachinePays } from '@hidewright/domain';
import { useWatch } from 'react-hook-form';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { Notice } from '../../../components/notice.tsx';
import { moneyText, numberText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { hoursAndMinutes, monthsText, paysWords } from '../pays-words.ts';
import { answerFor, type TypedMachine } from '../typed-machine.ts';
import { PaybackSeam } from './payback-seam.tsx';

/** Whether it pays, by what is typed so far. */
export function MachinePaysAnswer() {
  const typed = useWatch() as TypedMachine;
  const answer = answerFor(typed);
  if ('why' in answer) {
    return (
      <p className="p-4 text-ink-soft">
        {`Type what it costs and what it saves: whether it pays, and from how many runs, stands here. ${answer.why}`}
      </p>
    );
  }
  return <Answer typed={typed} pays={answer.pays} />;
}

function Answer({ typed, pays }: { typed: TypedMachine; pays: MachinePays }) {
  const { currency } = useWorkshop();
  const { paybackMonths, runsToPay } = pays;
  const worthIt = Number(pays.presentValue) >= 0;
  return (
    <Card title={worthIt ? 'It pays' : 'It does not pay'} subtitle={`amounts in ${currency}`}>
      <PaybackSeam years={Number(typed.years)} paybackMonths={paybackMonths} />
      <div className="mt-5">
        <KeyFigures
          large
          figures={[
            {
              word: 'saved a month',
              figure: moneyText(pays.savedPerMonth),
              note: hoursAndMinutes(pays.minutesSavedPerMonth),
            },
            {
              word: paybackMonths === null ? 'paid back' : 'paid back after',
              figure: paybackMonths === null ? 'never' : monthsText(paybackMonths),
              note: 'upkeep paid',
            },
            {
              word: 'worth over its life',
              figure: moneyText(pays.presentValue),
              note: 'today, its price taken off',
            },
            {
              word: 'worn off a year',
              figure: moneyText(pays.wornPerYear),
              note: 'its price in equal parts',
            },
            {
              word: 'pays from',
              figure: runsToPay === null ? 'no number' : numberText(runsToPay, 1),
              note: 'runs a month',
            },
          ]}
        />
      </div>
      <Notice tone={worthIt ? 'info' : 'attention'} className="mt-5">
        {paysWords(typed, pays).join(' ')}
      </Notice>
    </Card>
  );
}
