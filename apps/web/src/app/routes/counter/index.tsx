import { redirect } from 'react-router-dom';

export function loader() {
  return redirect('/counter/quotes');
}

export function Component() {
  return null;
}
