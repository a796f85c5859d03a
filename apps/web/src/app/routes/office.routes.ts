import type { RouteObject } from 'react-router-dom';

export const officeRoutes: RouteObject[] = [
  {
    path: '/office',
    handle: { crumb: 'Office' },
    children: [
      { index: true, lazy: () => import('./office/index.tsx') },
      { path: 'people', handle: { crumb: 'People' }, lazy: () => import('./office/people.tsx') },
      { path: 'log', handle: { crumb: 'Who did what' }, lazy: () => import('./office/log.tsx') },
    ],
  },
];
