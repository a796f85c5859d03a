import type { RouteObject } from 'react-router-dom';

/** The customer's pages, reached by a signed link: outside the shell, without a session. */
export const linkRoutes: RouteObject[] = [{ path: '/c/:token', lazy: () => import('./offer.tsx') }];
