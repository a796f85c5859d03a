import type { PurchaseLine } from '@hidewright/contract';
import type { AreaHabit } from '@hidewright/domain';
import { dayText, rackAreaText } from '../../lib/formatting.ts';
import { goodsText } from './goods-text.ts';

type Habit = AreaHabit & { today: string };

interface ReceivedWords {
  came: string;
  /** by its marks, 58.2 ft² measured */
  measured: string | undefined;
  /** 20 sent back on Thu 3 Dec */
  sentBack: string | undefined;
}

/** What came of a line in words, and what of it went back. */
export function receivedWords(line: PurchaseLine, workshop: Habit): ReceivedWords {
  const { receivedAreaMm2, measuredAreaMm2, received, unit } = line;
  return {
    came: goodsText({ areaMm2: receivedAreaMm2, quantity: received }, workshop, unit),
    measured:
      measuredAreaMm2 === null
        ? undefined
        : `by its marks, ${rackAreaText(measuredAreaMm2, workshop)} measured`,
    sentBack: sentBackWords(line, workshop),
  };
}

function sentBackWords({ sentBack, unit }: PurchaseLine, workshop: Habit): string | undefined {
  if (sentBack === null) return undefined;
  const { firstOn, lastOn } = sentBack;
  const day = dayText(lastOn, workshop.today);
  return `${goodsText(sentBack, workshop, unit)} sent back${firstOn === lastOn ? ' on' : ', last on'} ${day}`;
}
