import { createBrowserRouter, redirect } from 'react-router-dom';
import { PageLoading } from '../components/loading.tsx';
import { RouteError } from '../components/route-error.tsx';
import { guardRoom, guardSession } from './guard.ts';
import { OutsideError } from './outside-error.tsx';
import { benchRoutes } from './routes/bench.routes.ts';
import { booksRoutes } from './routes/books.routes.ts';
import { counterRoutes } from './routes/counter.routes.ts';
import { linkRoutes } from './routes/link.routes.ts';
import { officeRoutes } from './routes/office.routes.ts';
import { patternRoomRoutes } from './routes/pattern-room.routes.ts';
import { stockroomRoutes } from './routes/stockroom.routes.ts';
import { tagRoutes } from './routes/tag.routes.ts';
import { todayRoutes } from './routes/today.routes.ts';
import { Shell } from './shell.tsx';

export const router: ReturnType<typeof createBrowserRouter> = createBrowserRouter([
  {
    ErrorBoundary: OutsideError,
    HydrateFallback: PageLoading,
    children: [
      { path: '/sign-in', lazy: () => import('./routes/sign-in.tsx') },
      { path: '/open-shop', lazy: () => import('./routes/open-shop.tsx') },
      ...linkRoutes,
      {
        Component: Shell,
        children: [
          {
            // Here and not on the shell, so that whoever is refused at a typed address is told so within it.
            middleware: [guardSession, guardRoom],
            ErrorBoundary: RouteError,
            // Middleware runs only where something is loaded.
            loader: () => null,
            shouldRevalidate: () => true,
            children: [
              { path: '/', loader: () => redirect('/today'), Component: PageLoading },
              ...todayRoutes,
              ...counterRoutes,
              ...patternRoomRoutes,
              ...benchRoutes,
              ...stockroomRoutes,
              ...booksRoutes,
              ...officeRoutes,
              ...tagRoutes,
              { path: '/closed/:room', lazy: () => import('./routes/closed-room.tsx') },
              { path: '*', lazy: () => import('./routes/not-found.tsx') },
            ],
          },
        ],
      },
    ],
  },
]);
