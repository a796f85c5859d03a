import { Decimal } from 'decimal.js';
import { classNames } from '../lib/class-names.ts';
import { moneyText } from '../lib/formatting.ts';

export interface WaterfallLine {
  label: string;
  /** Positive for what is taken away; the first line is the price. */
  amount: string;
  kind: 'price' | 'bought' | 'work' | 'left';
  /** Opens the workings of the line. */
  onOpen?: (() => void) | undefined;
}

interface WaterfallProps {
  label: string;
  lines: readonly WaterfallLine[];
  places?: number | undefined;
}

const bars = { price: 'bg-slate', bought: 'bg-russet/75', work: 'bg-edge', left: 'bg-verdigris' };

/** From the price to what is left: each bar takes its part away, where the one above it ended. */
export function Waterfall({ label, lines, places = 2 }: WaterfallProps) {
  const price = new Decimal(lines[0]?.amount ?? 0);
  const scale = Decimal.max(
    price,
    ...lines.map((line) => new Decimal(line.amount).abs()),
    '0.0001',
  );
  const share = (amount: Decimal.Value) => new Decimal(amount).div(scale).times(100).toNumber();
  return (
    <table className="w-full" aria-label={label}>
      <tbody>
        {placed(lines, price).map(({ line, start, length }) => (
          <tr key={line.label} className="h-9">
            <th
              scope="row"
              className={classNames(
                'pr-3 text-left',
                line.kind === 'left' ? 'font-bold' : 'font-normal',
              )}
            >
              <LineName line={line} />
            </th>
            <td className="w-1/2 py-1" aria-hidden="true">
              <span
                className={classNames(
                  'block h-3.5 rounded-[2px]',
                  line.kind === 'left' && length.isNeg() ? 'broken' : bars[line.kind],
                )}
                style={{
                  marginLeft: `${share(start)}%`,
                  width: `${Math.max(share(length.abs()), 0.6)}%`,
                }}
              />
            </td>
            <td className="pl-3 text-right font-semibold whitespace-nowrap">
              {moneyText(line.amount, places)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** Where each bar begins: a cost ends where the one before it began; price and rest begin at nothing. */
function placed(lines: readonly WaterfallLine[], price: Decimal) {
  let rest = price;
  return lines.map((line) => {
    const length = new Decimal(line.amount);
    if (line.kind === 'price' || line.kind === 'left')
      return { line, start: new Decimal(0), length };
    rest = rest.minus(length);
    return { line, start: Decimal.max(rest, 0), length };
  });
}

function LineName({ line }: { line: WaterfallLine }) {
  if (!line.onOpen) return line.label;
  return (
    <button
      type="button"
      onClick={line.onOpen}
      className="-mx-1.5 min-h-8 rounded px-1.5 text-left underline decoration-stitch decoration-dashed underline-offset-4 hover:bg-manila"
    >
      {line.label}
    </button>
  );
}
