import { addPattern, addTool, changePattern, readToolingAdvice } from '@hidewright/contract';
import type { RouteObject } from 'react-router-dom';
import { opensFor } from '../guard.ts';

const nameOf = (thing: unknown) => (thing as { name: string }).name;

export const patternRoomRoutes: RouteObject[] = [
  {
    path: '/pattern-room',
    handle: { crumb: 'Pattern room' },
    children: [
      { index: true, lazy: () => import('./pattern-room/index.tsx') },
      {
        path: 'patterns',
        handle: { crumb: 'Patterns' },
        children: [
          { index: true, lazy: () => import('./pattern-room/patterns.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addPattern)],
            lazy: () => import('./pattern-room/new-pattern.tsx'),
          },
          {
            path: ':id',
            handle: { crumb: nameOf },
            lazy: () => import('./pattern-room/pattern.tsx'),
          },
          {
            path: ':id/cut-from',
            handle: { crumb: nameOf },
            lazy: () => import('./pattern-room/cut-from.tsx'),
          },
          {
            path: ':id/learned',
            handle: { crumb: nameOf },
            lazy: () => import('./pattern-room/learned.tsx'),
          },
          {
            path: ':id/time',
            handle: { crumb: nameOf },
            lazy: () => import('./pattern-room/time-step.tsx'),
          },
          {
            path: ':id/tooling',
            handle: { crumb: nameOf },
            middleware: [opensFor(readToolingAdvice)],
            lazy: () => import('./pattern-room/tooling-for.tsx'),
          },
          {
            path: ':id/change',
            handle: { crumb: nameOf },
            middleware: [opensFor(changePattern)],
            lazy: () => import('./pattern-room/change-pattern.tsx'),
          },
        ],
      },
      {
        path: 'presses',
        handle: { crumb: 'Presses' },
        children: [
          { index: true, lazy: () => import('./pattern-room/presses.tsx') },
          {
            path: 'pays',
            handle: { crumb: 'Does the machine pay?' },
            lazy: () => import('./pattern-room/machine-pays.tsx'),
          },
        ],
      },
      {
        path: 'tooling',
        handle: { crumb: 'Tooling' },
        children: [
          { index: true, lazy: () => import('./pattern-room/tooling.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addTool)],
            lazy: () => import('./pattern-room/new-tool.tsx'),
          },
          { path: ':id', handle: { crumb: nameOf }, lazy: () => import('./pattern-room/tool.tsx') },
        ],
      },
    ],
  },
];
