import type { RouteObject } from 'react-router-dom';

export const benchRoutes: RouteObject[] = [
  {
    path: '/bench',
    handle: { crumb: 'Bench' },
    children: [{ index: true, lazy: () => import('./bench/index.tsx') }],
  },
];
