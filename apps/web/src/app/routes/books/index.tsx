import { redirect } from 'react-router-dom';

export function loader() {
  return redirect('/books/invoices');
}

export function Component() {
  return null;
}
