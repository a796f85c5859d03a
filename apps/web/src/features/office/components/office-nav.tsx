import { SectionNav } from '../../../components/section-nav.tsx';

const places = [
  { to: '/office', word: 'The shop', end: true },
  { to: '/office/people', word: 'People' },
  { to: '/office/log', word: 'Who did what' },
];

export function OfficeNav() {
  return <SectionNav label="Office" items={places} />;
}
