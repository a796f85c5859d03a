import { Decimal } from 'decimal.js';
import { shareService } from '@hidewright/domain';
import { moneyText } from '../../http/decimal-text.ts';
import { invalid } from '../../http/problem.ts';
import { lineAmount } from '../../modules/purchase-orders/line-amount.ts';
import type { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import { readGoneOut } from '../../modules/stock/gone-out.ts';
import type { Work } from '../../work.ts';
import type { LotLine, PricedLine } from './price-delivery.ts';

/**
 * What came back from a service bears what the leather had cost that went out, and the work, shared by area over the
 * lots of its line.
 * @throws {Problem} 422 where a marked area was typed: the work has its price, whatever is stamped on the leather
 */
export async function withServices(work: Work, priced: PricedLine[]): Promise<PricedLine[]> {
  const told = new Map<PricedLine, Pick<PricedLine, 'goods' | 'material'>>();
  for (const service of servicesOf(priced)) {
    const lots = lotsOf(priced, service);
    requireNoMark(lots);
    const { value } = await readGoneOut(work.em, service.id);
    const cost = { material: moneyText(value), goods: moneyText(lineAmount(service)) };
    const shares = shareService(
      cost,
      lots.map(({ typed }) => ({ areaMm2: typed.measuredAreaMm2, asked: typed.cost })),
    );
    shares.forEach(({ material, goods }, at) => {
      const lot = lots[at];
      if (lot) told.set(lot, { material: new Decimal(material), goods: new Decimal(goods) });
    });
  }
  return priced.map((line) => ({ ...line, ...told.get(line) }));
}

const isLot = (line: PricedLine): line is LotLine => line.of === 'lot';

const servicesOf = (priced: PricedLine[]): Set<PurchaseLine> =>
  new Set(priced.filter(isLot).flatMap(({ service }) => service ?? []));

const lotsOf = (priced: PricedLine[], service: PurchaseLine): LotLine[] =>
  priced.filter(isLot).filter((line) => line.service === service);

function requireNoMark(lots: LotLine[]): void {
  const marked = lots.filter(({ markedAreaMm2 }) => markedAreaMm2 !== null);
  if (marked.length === 0) return;
  const message = 'Leave the marked area empty: the work has its price on the order.';
  throw invalid(marked.map(({ field }) => ({ field: `${field}.markedAreaMm2`, message })));
}
