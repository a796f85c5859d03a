import { Router } from 'express';
import {
  addCustomer,
  changeCustomer,
  listCustomers,
  readCustomer,
  type Customer as CustomerReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { invalid, notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Customer } from './customer.entity.ts';

export function customerRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listCustomers, async ({ em }, { query }) => {
    const below = readCursor(query.cursor);
    const rows = await em.find(
      Customer,
      {
        ...(below === undefined ? {} : { id: { $lt: below } }),
        ...(query.active === undefined ? {} : { active: query.active === 'yes' }),
        ...(query.q === undefined
          ? {}
          : { $or: ['name', 'contactName', 'email'].map(like(query.q)) }),
      },
      { orderBy: { id: 'desc' }, limit: query.limit + 1 },
    );
    const { items, next } = toPage(rows, query.limit, (row) => row.id);
    return { items: items.map(toReply), next };
  });

  serve(router, context, readCustomer, async (work, { params }) =>
    toReply(await find(work, params.id)),
  );

  serve(router, context, addCustomer, async (work, { body }) => {
    await requireOwnName(work, body.name);
    const customer = work.em.create(Customer, { ...body, createdAt: work.now.toISOString() });
    await work.em.flush();
    await logDeed(work, {
      action: `added customer ${customer.name}`,
      subjectKind: 'customer',
      subjectId: customer.id,
    });
    return toReply(customer);
  });

  serve(router, context, changeCustomer, async (work, { params, body, ifMatch }) => {
    const customer = await find(work, params.id);
    await requireVersion(
      work.em,
      { kind: 'customer', id: customer.id, version: customer.version },
      ifMatch,
    );
    if (body.name !== undefined) await requireOwnName(work, body.name, customer.id);
    assignDefined(customer, body);
    await work.em.flush();
    await logDeed(work, {
      action: `changed customer ${customer.name}`,
      subjectKind: 'customer',
      subjectId: customer.id,
      detail: { changed: Object.keys(body) },
    });
    return toReply(customer);
  });

  return router;
}

const like = (text: string) => (field: string) => ({ [field]: { $like: `%${text}%` } });

async function find(work: Work, id: number): Promise<Customer> {
  const customer = await work.em.findOne(Customer, id);
  if (customer === null) throw notFound('customer');
  return customer;
}

async function requireOwnName(work: Work, name: string, own = 0): Promise<void> {
  if ((await work.em.findOne(Customer, { name, id: { $ne: own } })) === null) return;
  const message =
    'There is a customer of that name already. Open that one, or add what tells the two apart.';
  throw invalid([{ field: 'name', message }]);
}

function toReply(customer: Customer): CustomerReply {
  return {
    id: customer.id,
    name: customer.name,
    contactName: customer.contactName,
    email: customer.email,
    phone: customer.phone,
    address: customer.address,
    note: customer.note,
    active: customer.active,
    createdAt: customer.createdAt,
    version: customer.version,
  };
}
