import type { Today } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { TextLink } from '../../../components/text-link.tsx';

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
            <li key={item.to} className="flex items-baseline justify-between gap-4">
              <TextLink to={item.to}>{item.name}</TextLink>
              <span className="text-right whitespace-nowrap">
                <span className="font-semibold">{item.free}</span>
                <span className="text-sm text-ink-soft"> free, keep {item.reorderAt}</span>
              </span>
            </li>
          ))}
        </ul>
      )}
    </Card>
  );
}
