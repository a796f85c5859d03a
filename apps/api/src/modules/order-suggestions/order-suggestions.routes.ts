import { Router } from 'express';
import { draftSuggested, listOrderSuggestions, orderByHand } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { draftSuggestedOrders } from '../../flows/draft-suggested-orders.ts';
import { setOrderByHand } from '../../flows/order-by-hand.ts';
import { suggestOrders } from '../../flows/order-suggestions/suggest-orders.ts';
import { suggestionReply } from '../../flows/order-suggestions/suggestion-reply.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import { readPurchaseOrderList } from '../purchase-orders/read-purchase-orders.ts';

const inTurn = ['now', 'drafted', 'soon', 'fine'] as const;

export function orderSuggestionRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listOrderSuggestions, async (work, { query }) => {
    const { items, unclear, ...around } = await suggestOrders(work);
    for (const { row, error } of unclear) {
      context.log.error(
        { err: error, of: row.of, id: row.id },
        'what to order of a thing could not be worked out',
      );
    }
    const due = items.filter(({ suggestion }) => suggestion.state !== 'fine');
    const shown = (query.show === 'all' ? items : due).map((item) => suggestionReply(item, around));
    const { servicePercent, holdingPercent, orderCost } = around.workshop;
    return {
      items: inTurn.flatMap((state) => shown.filter((each) => each.state === state)),
      next: null,
      fine: items.length - due.length,
      unclear: unclear.map(({ row: { of, id, name } }) => ({ of, id, name })),
      servicePercent: servicePercent.toString(),
      holdingPercent: holdingPercent.toString(),
      orderCost: moneyText(orderCost),
    };
  });

  serve(router, context, orderByHand, async (work, { params, body, ifMatch }) => {
    await setOrderByHand(work, { ...params, typed: body, ifMatch });
    const { items, ...around } = await suggestOrders(work);
    const item = items.find(({ row }) => row.of === params.of && row.id === params.id);
    if (item === undefined) throw notFound(params.of);
    return suggestionReply(item, around);
  });

  serve(router, context, draftSuggested, async (work, { body }) => {
    const { orderIds, notes } = await draftSuggestedOrders(work, body.lines);
    return { orders: await readPurchaseOrderList(work, { id: orderIds }, 100), notes };
  });

  return router;
}
