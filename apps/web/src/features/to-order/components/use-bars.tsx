import type { OrderSuggestionReply } from '@hidewright/contract';
import { periodWord } from '../to-order-words.ts';

const [wide, high] = [600, 64];

interface UseBarsProps {
  item: OrderSuggestionReply;
  say: (value: string) => string;
}

/** What was used in each period of the year, the latest at the right; the line is the mean. */
export function UseBars({ item, say }: UseBarsProps) {
  const { series, mean } = item.usage;
  const most = Math.max(...series.map(Number), 0);
  if (most === 0) return null;
  const each = wide / series.length;
  const y = high - (Number(mean) / most) * high;
  return (
    <svg
      viewBox={`0 0 ${wide} ${high}`}
      preserveAspectRatio="none"
      role="img"
      aria-label={`Use by ${periodWord(item)}: from ${say(String(Math.min(...series.map(Number))))} to ${say(String(most))}, the latest ${say(series.at(-1) ?? '0')}`}
      className="h-16 w-full max-w-2xl rounded bg-manila/40"
    >
      {series.map((use, at) => {
        const tall = (Number(use) / most) * high;
        return (
          <rect
            key={at}
            x={at * each + each * 0.1}
            width={each * 0.8}
            y={high - tall}
            height={tall}
            className="fill-russet"
          />
        );
      })}
      <line
        x1="0"
        x2={wide}
        y1={y}
        y2={y}
        strokeWidth="2"
        className="stroke-ink"
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}
