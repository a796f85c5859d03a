import { SectionNav } from '../../../components/section-nav.tsx';

const places = [
  { to: '/books/invoices', word: 'Invoices' },
  { to: '/books/owed', word: 'Owed' },
  { to: '/books/payments', word: 'Payments' },
  { to: '/books/sales-sheets', word: 'Sales sheets' },
  { to: '/books/tax', word: 'Tax' },
];

export function BooksNav() {
  return <SectionNav label="Books" items={places} />;
}
