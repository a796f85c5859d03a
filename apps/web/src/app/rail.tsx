import type { Role } from '@hidewright/contract';
import { NavLink } from 'react-router-dom';
import { RoomIcon } from './room-icon.tsx';
import { roomsFor } from './rooms.ts';

/** The rooms of the workshop, along the left of a wide screen, with a stitched edge. */
export function Rail({ role }: { role: Role }) {
  return (
    <div className="no-print sticky top-0 hidden h-dvh shrink-0 bg-card md:flex">
      <nav aria-label="Rooms" className="w-26 overflow-y-auto py-4">
        <ul className="space-y-1">
          {roomsFor(role).map((room) => (
            <li key={room.path}>
              <NavLink to={room.path} className={linkLook}>
                <RoomIcon name={room.icon} />
                <span className="pb-1">{room.word}</span>
              </NavLink>
            </li>
          ))}
        </ul>
      </nav>
      <div aria-hidden="true" className="stitched-down w-0.5" />
    </div>
  );
}

function linkLook({ isActive }: { isActive: boolean }): string {
  const base =
    'mx-1.5 flex flex-col items-center gap-1 rounded pt-2.5 pb-1.5 text-sm outline-offset-0! [&>span]:bg-bottom [&>span]:bg-[length:100%_2px] [&>span]:bg-no-repeat';
  return isActive
    ? `${base} font-bold text-verdigris [&>span]:stitched-act`
    : `${base} text-ink-soft hover:bg-stitch/20 hover:text-ink`;
}
