import { redirect } from 'react-router-dom';

export function loader() {
  return redirect('/stockroom/leather');
}

export function Component() {
  return null;
}
