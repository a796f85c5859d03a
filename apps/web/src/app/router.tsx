import { createBrowserRouter, redirect } from 'react-router-dom';
import { PageLoading } from '../components/loading.tsx';
import { RouteError } from '../components/route-error.tsx';
import { guardRooms } from './guard.ts';
import { benchRoutes } from './routes/bench.routes.ts';
import { booksRoutes } from './routes/books.routes.ts';
import { counterRoutes } from './routes/counter.routes.ts';
import { linkRoutes } from './routes/link.routes.ts';
import { officeRoutes } from './routes/office.routes.ts';
import { patternRoomRoutes } from './routes/pattern-room.routes.ts';
import { stockroomRoutes } from './routes/stockroom.routes.ts';
import { todayRoutes } from './routes/today.routes.ts';
import { Shell } from './shell.tsx';

export const router: ReturnType<typeof createBrowserRouter> = createBrowserRouter([
  {
    ErrorBoundary: RouteError,
    HydrateFallback: PageLoading,
    children: [
      { path: '/sign-in', lazy: () => import('./routes/sign-in.tsx') },
      { path: '/open-shop', lazy: () => import('./routes/open-shop.tsx') },
      ...linkRoutes,
      {
        middleware: [guardRooms],
        Component: Shell,
        // Middleware runs only where something is loaded.
        loader: () => null,
        children: [
          {
            ErrorBoundary: RouteError,
            children: [
              { path: '/', loader: () => redirect('/today') },
              ...todayRoutes,
              ...counterRoutes,
              ...patternRoomRoutes,
              ...benchRoutes,
              ...stockroomRoutes,
              ...booksRoutes,
              ...officeRoutes,
              { path: '*', lazy: () => import('./routes/not-found.tsx') },
            ],
          },
        ],
      },
    ],
  },
]);
