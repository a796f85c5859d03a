import type { Learned } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { areaText, minutesText, numberText, percentText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { minutesBehind, rejectsBehind, runsWord } from '../learned-words.ts';

const goodPerWords = {
  piece: 'for each good piece',
  hundred: 'for 100 good pieces',
  run: 'for each run',
};

/** The runs that count, taken together by their pieces. */
export function LearnedTogether({ learned }: { learned: Learned }) {
  const { areaUnit, currency } = useWorkshop();
  const { minutes, rejects, leather, hardware, money } = learned;
  const mixed = learned.runs.filter(({ mixedIn }) => mixedIn).length;
  const area = (text: string | null) => (text === null ? null : areaText(text, areaUnit, 3));
  const eachCost = (text: string) => `${currency} ${new Decimal(text).toFixed(3)} each`;
  const costs = [
    money?.leatherPerGood && `leather ${eachCost(money.leatherPerGood)}`,
    money?.hardwarePerGood && `hardware ${eachCost(money.hardwarePerGood)}`,
  ].filter(Boolean);
  return (
    <Card title="Together" subtitle={`${runsWord(mixed)}, weighed by their pieces`}>
      <KeyFigures
        large
        figures={[
          {
            word: 'minutes per 100 cut',
            figure: minutes.found ? minutesText(minutes.found.per100) : 'not logged',
            note: minutes.found && minutesBehind(minutes.found),
          },
          {
            word: 'rejects',
            figure: rejects.found ? percentText(rejects.found.percent, 2) : 'not counted',
            note: rejects.found && rejectsBehind(rejects.found),
          },
          {
            word: 'leather for each good piece',
            figure: area(leather.foundMm2) ?? 'not logged',
            note: leather.saidMm2 && `the layout and its rejects say ${area(leather.saidMm2)}`,
          },
        ]}
      />
      {hardware.length > 0 && (
        <>
          <h3 className="mt-4">Hardware that was taken</h3>
          <ul>
            {hardware.map(({ name, per, said, found }) => (
              <li key={name}>
                {`${name}: ${found === null ? 'not logged' : `${numberText(found, 2)} ${goodPerWords[per]}`}`}
                <span className="text-ink-soft">{`, the pattern says ${said}`}</span>
              </li>
            ))}
          </ul>
        </>
      )}
      {costs.length > 0 && (
        <p className="mt-3 text-ink-soft">{`From the stock’s worth: ${costs.join(', ')}.`}</p>
      )}
    </Card>
  );
}
