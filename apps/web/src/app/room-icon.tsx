const drawings = {
  today: 'M3 12h4l2.5-6 4.5 12 2.5-6H21',
  counter: 'M4 9.5 6 5h12l2 4.5M4 9.5h16V19H4zM10 13h4',
  'pattern-room':
    'M8.5 3.5c2.4 0 3.6 2 3.3 4.2-.3 2.3.6 3.4 2.4 5.2 2.2 2.2 3 4.6 1.5 6.4-1.7 2-5 1.6-7-.6C6 15.9 5 11.8 5 8c0-2.5 1.2-4.5 3.5-4.5z',
  bench: 'M3 9h18M6 9v10M18 9v10M9 9V5.5h6V9',
  stockroom:
    'M5 5c2 1.6 4.5 2 7 2s5-.4 7-2c-.7 2.3-.7 4 0 6-2 1.5-4.5 2-7 2s-5-.5-7-2c.7-2 .7-3.7 0-6zM5.5 14.5c1.8 1.3 4 1.8 6.5 1.8s4.7-.5 6.5-1.8M5.5 18c1.8 1.3 4 1.8 6.5 1.8s4.7-.5 6.5-1.8',
  books:
    'M12 6.5C10 5 7 4.7 4 5v13.5c3-.3 6 0 8 1.5 2-1.5 5-1.8 8-1.5V5c-3-.3-6 0-8 1.5zM12 6.5V20',
  office: 'M6 3.5h12v17H6zM9 8h6M9 12h6M9 16h3.5',
  scan: 'M4 8V4h4M16 4h4v4M20 16v4h-4M8 20H4v-4M8 9v6M11 9v6M13.5 9v6M16 9v6',
  more: 'M5 12h.01M12 12h.01M19 12h.01',
} as const;

export type RoomIconName = keyof typeof drawings;

/** Our own line drawings; the word beside each one carries the meaning. */
export function RoomIcon({ name, size = 24 }: { name: RoomIconName; size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 24 24"
      fill="none"
      stroke="currentColor"
      strokeWidth={name === 'more' ? 3 : 1.7}
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
    >
      <path d={drawings[name]} />
    </svg>
  );
}
