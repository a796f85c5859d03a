import type { RouteObject } from 'react-router-dom';

export const officeRoutes: RouteObject[] = [
  {
    path: '/office',
    handle: { crumb: 'Office' },
    children: [{ index: true, lazy: () => import('./office/index.tsx') }],
  },
];
