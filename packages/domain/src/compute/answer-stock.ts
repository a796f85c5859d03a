import { InvalidInput } from '../errors/domain-error.ts';
import { availableToPromise } from '../stock/available-to-promise.ts';
import { crostonForecast, smoothedUse } from '../stock/forecast.ts';
import { orderQuantity } from '../stock/order-quantity.ts';
import { reorderPoint } from '../stock/reorder-point.ts';
import { type CostedMovement, stockCost } from '../stock/stock-cost.ts';
import type { Answers } from './answers.ts';
import { asNumber, InputReader } from './read-input.ts';
import { asPriceBreak } from './read-price-break.ts';

export const stockAnswers: Answers = {
  eoq: answerEoq,
  reorder: answerReorder,

  croston(input) {
    const read = new InputReader(input, ['series', 'alpha']);
    return crostonForecast(read.list('series', asNumber), read.number('alpha'));
  },

  smooth(input) {
    const read = new InputReader(input, ['series', 'alpha', 'first']);
    const series = read.list('series', asNumber);
    return { forecast: smoothedUse(series, read.number('alpha'), read.number('first')) };
  },

  'stock-cost'(input) {
    const read = new InputReader(input, ['movements', 'method']);
    const method = read.choice('method', ['fifo', 'movingAverage']);
    return stockCost(read.list('movements', asMovement), method);
  },

  available(input) {
    const read = new InputReader(input, ['onHand', 'receipts', 'orders']);
    const onHand = read.number('onHand');
    const receipts = read.list('receipts', asNumber);
    const orders = read.list('orders', asNumber);
    return { available: availableToPromise({ onHand, receipts, orders }) };
  },
};

function answerEoq(input: unknown) {
  const known = ['demand', 'orderCost', 'holdingCost', 'holdingRate', 'breaks'];
  const read = new InputReader(input, known);
  const asked = { demand: read.number('demand'), orderCost: read.decimal('orderCost') };
  if (read.has('holdingCost') === read.has('holdingRate')) {
    throw new InvalidInput(
      'holdingCost',
      'Give either holdingCost or holdingRate, not both and not neither.',
    );
  }
  if (read.has('holdingRate')) {
    const holdingRate = read.number('holdingRate');
    return orderQuantity({ ...asked, holdingRate, breaks: read.list('breaks', asPriceBreak) });
  }
  const holdingCost = read.decimal('holdingCost');
  if (!read.has('breaks')) return orderQuantity({ ...asked, holdingCost });
  return orderQuantity({ ...asked, holdingCost, breaks: read.list('breaks', asPriceBreak) });
}

function answerReorder(input: unknown) {
  const known = ['demandMean', 'demandSd', 'leadMean', 'leadSd', 'service', 'z'];
  const read = new InputReader(input, known);
  if (read.has('service') === read.has('z')) {
    throw new InvalidInput('service', 'Give either service or z, not both and not neither.');
  }
  const over = {
    demandMean: read.number('demandMean'),
    demandSd: read.number('demandSd'),
    leadMean: read.number('leadMean'),
    leadSd: read.number('leadSd'),
  };
  return reorderPoint(
    read.has('z') ? { ...over, z: read.number('z') } : { ...over, service: read.number('service') },
  );
}

function asMovement(value: unknown, field: string): CostedMovement {
  const read = new InputReader(value, ['in', 'out', 'unitCost'], field);
  if (read.has('in') === read.has('out')) {
    throw new InvalidInput(field, `Give either in or out for ${field}, not both and not neither.`);
  }
  if (read.has('in')) return { in: read.decimal('in'), unitCost: read.decimal('unitCost') };
  if (read.has('unitCost')) {
    throw new InvalidInput(
      `${field}.unitCost`,
      `Leave out ${field}.unitCost: what is taken costs what it cost to buy.`,
    );
  }
  return { out: read.decimal('out') };
}
