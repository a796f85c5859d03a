import { SectionNav, type SectionLink } from '../../../components/section-nav.tsx';

const items: readonly SectionLink[] = [
  { to: '/pattern-room/patterns', word: 'Patterns' },
  { to: '/pattern-room/tooling', word: 'Tooling' },
  { to: '/pattern-room/presses', word: 'Presses' },
];

/** The places of the pattern room. */
export function PatternRoomNav() {
  return <SectionNav label="Pattern room" items={items} />;
}
