import { classNames } from '../lib/class-names.ts';
import { stateLooks, type StateShape, type StateTone } from './state-shapes.ts';

const shapes: Record<StateShape, { outline: boolean; path: string }> = {
  hollow: { outline: true, path: '' },
  half: { outline: true, path: 'M8 4.5a3.5 3.5 0 0 1 0 7z' },
  full: { outline: true, path: 'M4.5 8a3.5 3.5 0 1 0 7 0a3.5 3.5 0 1 0-7 0z' },
  check: { outline: false, path: 'm3 8.5 3.2 3.2L13 4.8' },
  cross: { outline: false, path: 'm4 4 8 8m0-8-8 8' },
  dash: { outline: false, path: 'M3.5 8h9' },
  wait: { outline: false, path: 'M4 3h8L4 13h8z' },
  arrow: { outline: false, path: 'M3 8h9.5M9 4.5 12.5 8 9 11.5' },
};

const tones: Record<StateTone, string> = {
  quiet: 'text-ink-soft bg-stitch/25',
  act: 'text-verdigris bg-verdigris-pale',
  attention: 'text-brass bg-brass-pale',
  danger: 'text-oxblood bg-oxblood-pale',
  info: 'text-slate bg-slate-pale',
};

interface StateMarkProps {
  /** The state's own word, as in "awaiting proof". */
  state: string;
  /** Words to show instead, such as "draft 2". */
  children?: string | undefined;
  className?: string | undefined;
}

/** A state: its word, a shape and a colour, so that none has to be told by colour alone. */
export function StateMark({ state, children, className }: StateMarkProps) {
  const [shape, tone] = stateLooks[state] ?? (['hollow', 'quiet'] as const);
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-1.5 rounded px-2 py-px text-sm font-semibold whitespace-nowrap',
        tones[tone],
        className,
      )}
    >
      <ShapeIcon shape={shape} />
      {children ?? state}
    </span>
  );
}

function ShapeIcon({ shape }: { shape: StateShape }) {
  const { outline, path } = shapes[shape];
  return (
    <svg width="14" height="14" viewBox="0 0 16 16" aria-hidden="true" className="shrink-0">
      {outline && (
        <circle cx="8" cy="8" r="6" fill="none" stroke="currentColor" strokeWidth="1.8" />
      )}
      <path
        d={path}
        fill={outline ? 'currentColor' : 'none'}
        stroke={outline ? 'none' : 'currentColor'}
        strokeWidth="2"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  );
}
