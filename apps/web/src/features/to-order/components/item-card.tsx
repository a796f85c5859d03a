import type { OrderSuggestionReply } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, dayText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { amountText, heldNote, priceWords, wholeWords } from '../to-order-words.ts';
import { ByHand } from './by-hand.tsx';
import { ComingWeeks } from './coming-weeks.tsx';
import { HowWorkedOut } from './how-worked-out.tsx';

type Item = OrderSuggestionReply;

interface ItemCardProps {
  item: Item;
  mayOrder: boolean;
  orderCost: string | undefined;
  holdingPercent: string;
  servicePercent: string;
  /** What the owner may do about it. */
  children?: ReactNode | undefined;
}

/** One thing: why, how it stands, what to do; and behind it how that is worked out. */
export function ItemCard({ item, mayOrder, children, ...rates }: ItemCardProps) {
  const workshop = useWorkshop();
  const to = `/stockroom/${item.of}/${item.id}`;
  return (
    <Card
      title={<TextLink to={to}>{item.name}</TextLink>}
      subtitle={item.supplierName ? `from ${item.supplierName}` : 'nobody is named who sells it'}
    >
      <p className="mb-4 max-w-prose">{item.why}</p>
      <Kits item={item} />
      <KeyFigures figures={figuresOf(item, workshop)} />
      {children && item.state !== 'fine' && (
        <div className="mt-4 border-t border-stitch pt-4">{children}</div>
      )}
      <Drafts item={item} />
      <details className="mt-3">
        <summary className="min-h-11 rounded py-2.5 font-semibold">
          The coming weeks, and how it is worked out
          <span className="sr-only">: {item.name}</span>
        </summary>
        <div className="space-y-5 pt-2">
          <ComingWeeks item={item} />
          <HowWorkedOut item={item} {...rates} />
          {mayOrder && <ByHand item={item} />}
          {item.state === 'fine' && children}
        </div>
      </details>
    </Card>
  );
}

/** Kits are not bought themselves: this is one of the things that make them up. */
function Kits({ item: { kits } }: { item: Item }) {
  if (kits.length === 0) return null;
  return (
    <ul className="-mt-2 mb-4 max-w-prose text-ink-soft">
      {kits.map(({ id, name, free }) => (
        <li key={id}>
          {'A part of the kit '}
          <TextLink to={`/stockroom/hardware/${id}`}>{name}</TextLink>
          {`: what is free of all its parts makes up ${countText(free)}.`}
        </li>
      ))}
    </ul>
  );
}

function figuresOf(item: Item, workshop: Workshop) {
  const say = (value: string) => amountText(value, item, workshop);
  const { whole, quantity, usual } = item;
  const order = quantity === '0' ? usual : quantity;
  return [
    {
      word: 'on hand',
      figure: say(item.onHand),
      note: heldNote(item, say),
    },
    { word: 'promised', figure: say(item.promised) },
    { word: 'on order', figure: say(item.onOrder) },
    runsOut(item, workshop),
    ...(item.state === 'drafted'
      ? [{ word: 'on a draft', figure: say(item.drafted) }]
      : [
          {
            word: item.state === 'now' ? 'order' : 'one order would be',
            figure: say(order),
            note:
              [wholeWords(order, { whole }), priceWords(item, workshop)]
                .filter(Boolean)
                .join(', ') || undefined,
          },
        ]),
  ];
}

function runsOut(item: Item, { today }: Workshop) {
  const { runsOutOn, belowMinimumOn, arrivesOn } = item;
  const note = arrivesOn === null ? undefined : `ordered today, here ${dayText(arrivesOn, today)}`;
  if (runsOutOn !== null) return { word: 'runs out', figure: dayText(runsOutOn, today), note };
  if (belowMinimumOn === today) return { word: 'below its minimum', figure: 'now', note };
  return belowMinimumOn === null
    ? { word: 'runs out', figure: 'not in 12 weeks', note }
    : { word: 'below its minimum', figure: dayText(belowMinimumOn, today), note };
}

function Drafts({ item }: { item: Item }) {
  if (item.drafts.length === 0) return null;
  return (
    <p className="mt-3">
      {'On draft '}
      {item.drafts.map(({ id, number }, at) => (
        <span key={id}>
          {at > 0 && ' and '}
          <TextLink to={`/stockroom/purchase-orders/${id}`}>{number}</TextLink>
        </span>
      ))}
      {', not sent yet.'}
    </p>
  );
}
