import type { RouteObject } from 'react-router-dom';

export const booksRoutes: RouteObject[] = [
  {
    path: '/books',
    handle: { crumb: 'Books' },
    children: [{ index: true, lazy: () => import('./books/index.tsx') }],
  },
];
