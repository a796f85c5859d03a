import type { RouteObject } from 'react-router-dom';

export const counterRoutes: RouteObject[] = [
  {
    path: '/counter',
    handle: { crumb: 'Counter' },
    children: [{ index: true, lazy: () => import('./counter/index.tsx') }],
  },
];
