import type { LoaderFunctionArgs } from 'react-router-dom';
import { RouteError } from '../../components/route-error.tsx';
import { roomAt } from '../rooms.ts';

/** Says that a room is not open to the one who is signed in, with the other rooms still at hand. */
export function loader({ params }: LoaderFunctionArgs): never {
  const room = roomAt(`/${params.room}`);
  throw new Response(
    `${room?.word ?? 'This room'} is not open to you. The owner can change your role.`,
    {
      status: 403,
    },
  );
}

export const Component = RouteError;
export const ErrorBoundary = RouteError;
