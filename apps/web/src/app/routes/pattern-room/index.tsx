import { redirect } from 'react-router-dom';

export function loader() {
  return redirect('/pattern-room/patterns');
}

export function Component() {
  return null;
}
