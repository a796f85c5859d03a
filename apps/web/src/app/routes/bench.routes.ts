import { startWeekMix } from '@hidewright/contract';
import type { RouteObject } from 'react-router-dom';
import { opensFor } from '../guard.ts';

const numberOf = (data: unknown) => (data as { number: string }).number;

export const benchRoutes: RouteObject[] = [
  {
    path: '/bench',
    handle: { crumb: 'Bench' },
    children: [
      { index: true, lazy: () => import('./bench/index.tsx') },
      {
        path: 'week-mix',
        handle: { crumb: 'A week’s mix' },
        middleware: [opensFor(startWeekMix)],
        lazy: () => import('./bench/week-mix.tsx'),
      },
      { path: 'jobs/:id', handle: { crumb: numberOf }, lazy: () => import('./bench/job.tsx') },
      {
        path: 'checks',
        handle: { crumb: 'Can we make them?' },
        lazy: () => import('./bench/checks.tsx'),
      },
      {
        path: 'checks/:id',
        handle: { crumb: 'Can we make it?' },
        lazy: () => import('./bench/check.tsx'),
      },
    ],
  },
];
