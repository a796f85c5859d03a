import type { RouteObject } from 'react-router-dom';

export const stockroomRoutes: RouteObject[] = [
  {
    path: '/stockroom',
    handle: { crumb: 'Stockroom' },
    children: [{ index: true, lazy: () => import('./stockroom/index.tsx') }],
  },
];
