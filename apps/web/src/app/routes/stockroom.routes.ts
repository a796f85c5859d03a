import {
  addHardware,
  addLeather,
  addPurchaseOrder,
  addSupplier,
  changePurchaseOrder,
  listOrderSuggestions,
  putOnShelf,
  receiveDelivery,
  sellFinished,
} from '@hidewright/contract';
import type { RouteObject } from 'react-router-dom';
import { opensFor } from '../guard.ts';

const nameOf = (thing: unknown) => (thing as { name: string }).name;
const finishedOf = (thing: unknown) => (thing as { patternName: string }).patternName;
const tagOf = (lot: unknown) => (lot as { tag: string }).tag;
const titleOf = (sheet: unknown) => (sheet as { title: string }).title;
const numberOf = (order: unknown) => (order as { number: string }).number;

export const stockroomRoutes: RouteObject[] = [
  {
    path: '/stockroom',
    handle: { crumb: 'Stockroom' },
    children: [
      { index: true, lazy: () => import('./stockroom/index.tsx') },
      {
        path: 'ledger',
        handle: { crumb: 'Ledger' },
        lazy: () => import('./stockroom/ledger.tsx'),
      },
      {
        path: 'on-hand',
        handle: { crumb: 'On hand' },
        lazy: () => import('./stockroom/on-hand.tsx'),
      },
      {
        path: 'to-order',
        handle: { crumb: 'To order' },
        middleware: [opensFor(listOrderSuggestions)],
        lazy: () => import('./stockroom/to-order.tsx'),
      },
      {
        path: 'tags',
        handle: { crumb: 'Tags' },
        lazy: () => import('./stockroom/labels.tsx'),
      },
      {
        path: 'counts',
        handle: { crumb: 'Counts' },
        children: [
          { index: true, lazy: () => import('./stockroom/counts.tsx') },
          {
            path: ':id',
            handle: { crumb: titleOf },
            lazy: () => import('./stockroom/count.tsx'),
          },
        ],
      },
      {
        path: 'scan',
        handle: { crumb: 'Scan' },
        lazy: () => import('./stockroom/scan.tsx'),
      },
      {
        path: 'receive',
        handle: { crumb: 'Receive' },
        middleware: [opensFor(receiveDelivery)],
        lazy: () => import('./stockroom/receive.tsx'),
      },
      {
        path: 'deliveries',
        handle: { crumb: 'Deliveries without an order' },
        lazy: () => import('./stockroom/deliveries.tsx'),
      },
      {
        path: 'leather',
        handle: { crumb: 'Leather' },
        children: [
          { index: true, lazy: () => import('./stockroom/leathers.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addLeather)],
            lazy: () => import('./stockroom/new-leather.tsx'),
          },
          { path: ':id', handle: { crumb: nameOf }, lazy: () => import('./stockroom/leather.tsx') },
        ],
      },
      {
        path: 'lots',
        handle: { crumb: 'Lots' },
        children: [
          { index: true, lazy: () => import('./stockroom/lots.tsx') },
          { path: ':id', handle: { crumb: tagOf }, lazy: () => import('./stockroom/lot.tsx') },
        ],
      },
      {
        path: 'hardware',
        handle: { crumb: 'Hardware and supplies' },
        children: [
          { index: true, lazy: () => import('./stockroom/hardware-list.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addHardware)],
            lazy: () => import('./stockroom/new-hardware.tsx'),
          },
          {
            path: ':id',
            handle: { crumb: nameOf },
            lazy: () => import('./stockroom/hardware.tsx'),
          },
        ],
      },
      {
        path: 'finished',
        handle: { crumb: 'Finished pieces' },
        children: [
          { index: true, lazy: () => import('./stockroom/finished-list.tsx') },
          {
            path: 'new',
            handle: { crumb: 'Put on the shelf' },
            middleware: [opensFor(putOnShelf)],
            lazy: () => import('./stockroom/put-on-shelf.tsx'),
          },
          {
            path: ':id',
            handle: { crumb: finishedOf },
            lazy: () => import('./stockroom/finished.tsx'),
          },
          {
            path: ':id/sell',
            handle: { crumb: finishedOf },
            middleware: [opensFor(sellFinished)],
            lazy: () => import('./stockroom/sell-finished.tsx'),
          },
        ],
      },
      {
        path: 'suppliers',
        handle: { crumb: 'Suppliers' },
        children: [
          { index: true, lazy: () => import('./stockroom/suppliers.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addSupplier)],
            lazy: () => import('./stockroom/new-supplier.tsx'),
          },
          {
            path: ':id',
            handle: { crumb: nameOf },
            lazy: () => import('./stockroom/supplier.tsx'),
          },
        ],
      },
      {
        path: 'purchase-orders',
        handle: { crumb: 'Purchase orders' },
        children: [
          { index: true, lazy: () => import('./stockroom/purchase-orders.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addPurchaseOrder)],
            lazy: () => import('./stockroom/new-purchase-order.tsx'),
          },
          {
            path: ':id',
            handle: { crumb: numberOf },
            lazy: () => import('./stockroom/purchase-order.tsx'),
          },
          {
            path: ':id/change',
            handle: { crumb: numberOf },
            middleware: [opensFor(changePurchaseOrder)],
            lazy: () => import('./stockroom/change-purchase-order.tsx'),
          },
        ],
      },
    ],
  },
];
