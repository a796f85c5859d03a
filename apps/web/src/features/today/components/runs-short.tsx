import type { ShortItem, Today } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { freeWords } from '../free-words.ts';

/** Hardware and supplies of which little is free. */
export function RunsShort({ short }: { short: NonNullable<Today['short']> }) {
  return (
    <Card
      title="Runs short"
      subtitle="less free than the shop wants to keep"
      aside={<TextLink to="/stockroom/to-order">What to order</TextLink>}
    >
      {short.length === 0 ? (
        <p className="text-ink-soft">Everything that is counted is above its mark.</p>
      ) : (
        <ul className="space-y-2">
          {short.map((item) => (
            <Line key={item.to} item={item} />
          ))}
        </ul>
      )}
    </Card>
  );
}

function Line({ item }: { item: ShortItem }) {
  const { figure, rest } = freeWords(item);
  return (
    <li className="flex items-baseline justify-between gap-4">
      <TextLink to={item.to}>{item.name}</TextLink>
      <span className="text-right">
        <span className="font-semibold">{figure}</span>{' '}
        <span className="text-sm text-ink-soft">{rest}</span>
      </span>
    </li>
  );
}
