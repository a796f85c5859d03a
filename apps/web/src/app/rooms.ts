import type { Role } from '@hidewright/contract';
import type { RoomIconName } from './room-icon.tsx';

export interface Room {
  path: string;
  word: string;
  icon: RoomIconName;
  roles: readonly Role[];
  /** The roles whose bar at the bottom of a phone shows it; for the others it is behind More. */
  bar: readonly Role[];
}

/** The seven places of the workshop: the only navigation, and who may enter each. */
export const rooms: readonly Room[] = [
  {
    path: '/today',
    word: 'Today',
    icon: 'today',
    roles: ['owner', 'maker', 'bookkeeper'],
    bar: ['owner', 'maker', 'bookkeeper'],
  },
  {
    path: '/counter',
    word: 'Counter',
    icon: 'counter',
    roles: ['owner', 'maker', 'bookkeeper'],
    bar: ['owner', 'bookkeeper'],
  },
  {
    path: '/pattern-room',
    word: 'Pattern room',
    icon: 'pattern-room',
    roles: ['owner', 'maker'],
    bar: [],
  },
  {
    path: '/bench',
    word: 'Bench',
    icon: 'bench',
    roles: ['owner', 'maker'],
    bar: ['owner', 'maker'],
  },
  {
    path: '/stockroom',
    word: 'Stockroom',
    icon: 'stockroom',
    roles: ['owner', 'maker', 'bookkeeper'],
    bar: ['owner', 'maker'],
  },
  {
    path: '/books',
    word: 'Books',
    icon: 'books',
    roles: ['owner', 'bookkeeper'],
    bar: ['bookkeeper'],
  },
  { path: '/office', word: 'Office', icon: 'office', roles: ['owner'], bar: [] },
];

export function roomsFor(role: Role): Room[] {
  return rooms.filter((room) => room.roles.includes(role));
}

export function roomAt(pathname: string): Room | undefined {
  return rooms.find((room) => pathname === room.path || pathname.startsWith(`${room.path}/`));
}
