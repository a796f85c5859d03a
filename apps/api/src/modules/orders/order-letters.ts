import { sayDay } from '../../say-day.ts';

export interface LetterAbout {
  order: { number: string; title: string; quantity: number; inHandsOn: string | null };
  /** Whom the letter greets. */
  addressee: string;
  shop: { name: string; address: string };
  /** The owner's own words; none where it is empty. */
  word: string;
}

export interface Letter {
  subject: string;
  body: string;
}

/** Tells a customer that their order is packed by another day than was promised. */
export function movedLetter(about: LetterAbout, moved: { fromDay: string; toDay: string }): Letter {
  const { order } = about;
  const sooner = moved.toDay < moved.fromDay ? 'sooner' : 'later';
  return letter(about, {
    subject: `order ${order.number} comes ${sooner}`,
    says: `your order ${order.number}, ${order.quantity} of ${order.title}, will be packed by ${sayDay(moved.toDay)} now, ${sooner} than ${sayDay(moved.fromDay)} as we had promised.`,
  });
}

/** Tells a customer that their order was cancelled. */
export function cancelledLetter(about: LetterAbout): Letter {
  const { order } = about;
  return letter(about, {
    subject: `order ${order.number} is cancelled`,
    says: `your order ${order.number}, ${order.quantity} of ${order.title}, is cancelled. Nothing more is made for it.`,
  });
}

function letter(
  { addressee, shop, word }: LetterAbout,
  { subject, says }: { subject: string; says: string },
): Letter {
  const from = shop.address.startsWith(shop.name) ? [shop.address] : [shop.name, shop.address];
  const paragraphs = [
    `Good day ${addressee},`,
    says,
    word,
    'Please write back if anything about it is not as you need it.',
    from.filter(Boolean).join('\n'),
  ];
  return {
    subject: `${shop.name}: ${subject}`,
    body: `${paragraphs.filter(Boolean).join('\n\n')}\n`,
  };
}
