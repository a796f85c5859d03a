import { RouteError } from '../../components/route-error.tsx';

export function loader(): never {
  throw new Response('There is no such place in the workshop.', { status: 404 });
}

export const Component = RouteError;
export const ErrorBoundary = RouteError;
