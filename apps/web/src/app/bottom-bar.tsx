import { Menu } from '@base-ui/react/menu';
import type { Role } from '@hidewright/contract';
import { useState } from 'react';
import { NavLink, useLocation, useNavigate } from 'react-router-dom';
import { menuLook } from './menu-look.ts';
import { RoomIcon, type RoomIconName } from './room-icon.tsx';
import { roomsFor } from './rooms.ts';

const itemLook =
  'flex min-h-14 w-full flex-col items-center justify-center gap-0.5 rounded px-1 text-center text-sm leading-tight outline-offset-0!';

/** Whoever works with the stock has it a thumb away. */
const scanPath = '/stockroom/scan';

/** On a phone: the rooms that the role uses most, the others behind More. */
export function BottomBar({ role }: { role: Role }) {
  const all = roomsFor(role);
  const shown = all.filter((room) => room.bar.includes(role));
  const others = all.filter((room) => !room.bar.includes(role));
  return (
    <nav
      aria-label="Rooms"
      className="no-print fixed inset-x-0 bottom-0 z-30 bg-card pb-[env(safe-area-inset-bottom)] md:hidden"
    >
      <div aria-hidden="true" className="stitched h-0.5" />
      <ul className="flex px-1 py-1">
        {shown.map((room) => (
          <li key={room.path} className="flex-1">
            <BarLink to={room.path} icon={room.icon} word={room.word} />
          </li>
        ))}
        {role === 'maker' && (
          <li className="flex-1">
            <BarLink to={scanPath} icon="scan" word="Scan" />
          </li>
        )}
        {others.length > 0 && (
          <li className="flex-1">
            <MoreRooms others={others} />
          </li>
        )}
      </ul>
    </nav>
  );
}

function BarLink({ to, icon, word }: { to: string; icon: RoomIconName; word: string }) {
  const { pathname } = useLocation();
  const elsewhere = to !== scanPath && pathname === scanPath;
  return (
    <NavLink
      to={to}
      className={({ isActive }) =>
        `${itemLook} ${isActive && !elsewhere ? 'font-bold text-verdigris underline decoration-dashed decoration-2 underline-offset-4' : 'text-ink-soft'}`
      }
    >
      <RoomIcon name={icon} size={22} />
      {word}
    </NavLink>
  );
}

function MoreRooms({ others }: { others: ReturnType<typeof roomsFor> }) {
  const navigate = useNavigate();
  // Within the bar, so that the open menu belongs to a landmark.
  const [home, setHome] = useState<HTMLElement | null>(null);
  return (
    <Menu.Root>
      <div ref={setHome} />
      <Menu.Trigger className={`${itemLook} text-ink-soft`}>
        <RoomIcon name="more" size={22} />
        More
      </Menu.Trigger>
      <Menu.Portal container={home}>
        <Menu.Positioner
          sideOffset={10}
          align="end"
          collisionPadding={8}
          className="z-40 outline-none"
        >
          <Menu.Popup className={menuLook.popup}>
            {others.map((room) => (
              <Menu.Item
                key={room.path}
                className={menuLook.item}
                onClick={() => void navigate(room.path)}
              >
                <RoomIcon name={room.icon} size={22} />
                {room.word}
              </Menu.Item>
            ))}
          </Menu.Popup>
        </Menu.Positioner>
      </Menu.Portal>
    </Menu.Root>
  );
}
