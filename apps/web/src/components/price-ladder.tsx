import { Decimal } from 'decimal.js';
import { classNames } from '../lib/class-names.ts';
import { countText, numberText, percentText, unitPriceText } from '../lib/formatting.ts';
import { PriceLadderBar } from './price-ladder-bar.tsx';

interface Rung {
  quantity: number;
  unitPrice: string;
  /** Left of the price after everything bought, by bench hours. */
  perBenchHour: string;
  /** Left after wages too, by all hours, desk time included. */
  perHourAllIn: string;
  /** Of the total, after all costs, in per cent. */
  marginPercent: string;
  /** It loses money: nothing is left. */
  loses: boolean;
}

interface PriceLadderProps {
  rungs: readonly Rung[];
  /** The workshop's target per bench hour. */
  target: string;
  currency: string;
  /** The quantity that the page is about. */
  chosen?: number | undefined;
  onChoose?: ((quantity: number) => void) | undefined;
}

/** Price breaks as a ladder: a rung per quantity, as long as what is left per bench hour; the target stands upright. */
export function PriceLadder({ rungs, target, currency, chosen, onChoose }: PriceLadderProps) {
  const longest = Decimal.max(1, target, ...rungs.map((rung) => rung.perBenchHour)).times('1.12');
  const share = (value: string) => Decimal.max(0, value).div(longest).times(100).toNumber();
  return (
    <table className="w-full border-separate border-spacing-0">
      <caption className="sr-only">
        {`Price breaks in ${currency}, each with its margin. What is left per bench hour and per hour all in, against a target of ${numberText(target, 2)} per bench hour.`}
      </caption>
      <thead className="text-ink-soft">
        <tr>
          <th scope="col" className="py-1 pr-3 text-right font-normal">
            pieces
          </th>
          <th scope="col" className="py-1 pr-2 text-right font-normal">
            each<span className="block text-sm">margin</span>
          </th>
          <th scope="col" className="relative h-8 w-[45%] p-0 font-normal">
            <span className="sr-only">left per hour against the target</span>
            <span
              aria-hidden="true"
              className="absolute bottom-0.5 text-sm whitespace-nowrap text-brass"
              // Its own share of itself to the left, so that it never leaves the column.
              style={{ left: `${share(target)}%`, transform: `translateX(-${share(target)}%)` }}
            >
              target {numberText(target, 2)}
            </span>
          </th>
          <th scope="col" className="py-1 pl-3 text-right font-normal">
            bench
          </th>
          <th scope="col" className="py-1 pr-2 pl-3 text-right font-normal whitespace-nowrap">
            all in
          </th>
        </tr>
      </thead>
      <tbody>
        {rungs.map((rung) => (
          <tr
            key={rung.quantity}
            aria-current={rung.quantity === chosen ? 'true' : undefined}
            className={classNames('h-12', rung.quantity === chosen && 'bg-verdigris-pale')}
          >
            <th
              scope="row"
              className={classNames(
                'border-l-4 pr-3 text-right font-semibold',
                rung.quantity === chosen ? 'border-verdigris' : 'border-transparent',
              )}
            >
              <RungChoice rung={rung} chosen={rung.quantity === chosen} onChoose={onChoose} />
            </th>
            <td className="pr-2 text-right leading-tight">
              <span className="font-semibold">{unitPriceText(rung.unitPrice)}</span>
              <span className="block text-sm whitespace-nowrap text-ink-soft">
                <span className="sr-only">, margin </span>
                {percentText(rung.marginPercent)}
              </span>
            </td>
            <td className="h-12 border-x-4 border-edge p-0">
              <PriceLadderBar
                loses={rung.loses}
                misses={new Decimal(rung.perBenchHour).lt(target)}
                bench={share(rung.perBenchHour)}
                allIn={share(rung.perHourAllIn)}
                target={share(target)}
              />
            </td>
            <td className="pl-3 text-right font-semibold">{numberText(rung.perBenchHour, 0)}</td>
            <td className="pr-2 pl-3 text-right font-semibold">
              {numberText(rung.perHourAllIn, 0)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

interface RungChoiceProps {
  rung: Rung;
  chosen: boolean;
  onChoose: PriceLadderProps['onChoose'];
}

function RungChoice({ rung, chosen, onChoose }: RungChoiceProps) {
  const quantity = countText(rung.quantity);
  if (!onChoose) return quantity;
  return (
    <button
      type="button"
      aria-pressed={chosen}
      onClick={() => onChoose(rung.quantity)}
      className="-mr-1.5 min-h-8 min-w-12 rounded px-1.5 text-right font-semibold underline decoration-stitch decoration-dashed underline-offset-4 hover:bg-manila"
    >
      {quantity}
      <span className="sr-only"> pieces: show this one</span>
    </button>
  );
}
