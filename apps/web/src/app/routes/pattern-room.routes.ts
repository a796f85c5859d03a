import type { RouteObject } from 'react-router-dom';

export const patternRoomRoutes: RouteObject[] = [
  {
    path: '/pattern-room',
    handle: { crumb: 'Pattern room' },
    children: [{ index: true, lazy: () => import('./pattern-room/index.tsx') }],
  },
];
