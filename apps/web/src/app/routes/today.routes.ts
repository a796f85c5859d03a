import type { RouteObject } from 'react-router-dom';

export const todayRoutes: RouteObject[] = [
  {
    path: '/today',
    handle: { crumb: 'Today' },
    children: [{ index: true, lazy: () => import('./today/index.tsx') }],
  },
];
