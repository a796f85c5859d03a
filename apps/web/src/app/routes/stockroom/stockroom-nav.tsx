import { SectionNav, type SectionLink } from '../../../components/section-nav.tsx';
import { useRole } from './use-role.ts';

const items: SectionLink[] = [
  { to: '/stockroom/leather', word: 'Leather' },
  { to: '/stockroom/lots', word: 'Lots' },
  { to: '/stockroom/hardware', word: 'Hardware and supplies' },
  { to: '/stockroom/finished', word: 'Finished pieces' },
  { to: '/stockroom/suppliers', word: 'Suppliers' },
  { to: '/stockroom/to-order', word: 'To order' },
  { to: '/stockroom/purchase-orders', word: 'Purchase orders' },
  { to: '/stockroom/on-hand', word: 'On hand' },
  { to: '/stockroom/ledger', word: 'Ledger' },
  { to: '/stockroom/counts', word: 'Counts' },
  { to: '/stockroom/tags', word: 'Tags' },
  { to: '/stockroom/scan', word: 'Scan' },
];

export function StockroomNav() {
  const { handlesStock } = useRole();
  const mine = handlesStock ? items : items.filter(({ to }) => to !== '/stockroom/to-order');
  return <SectionNav label="Stockroom" items={mine} />;
}
