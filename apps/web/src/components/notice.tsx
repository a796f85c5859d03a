import { CircleCheck, Info, OctagonAlert, TriangleAlert } from 'lucide-react';
import type { ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';

const tones = {
  attention: {
    box: 'border-brass bg-brass-pale',
    icon: TriangleAlert,
    ink: 'text-brass',
    word: 'Attention',
  },
  danger: {
    box: 'border-oxblood bg-oxblood-pale',
    icon: OctagonAlert,
    ink: 'text-oxblood',
    word: 'Warning',
  },
  info: { box: 'border-slate bg-slate-pale', icon: Info, ink: 'text-slate', word: 'Note' },
  ok: {
    box: 'border-verdigris bg-verdigris-pale',
    icon: CircleCheck,
    ink: 'text-verdigris',
    word: 'Done',
  },
};

interface NoticeProps {
  tone?: keyof typeof tones | undefined;
  title?: ReactNode | undefined;
  /** Read out when it appears: for what answers something the person just did. */
  live?: boolean | undefined;
  actions?: ReactNode | undefined;
  className?: string | undefined;
  children?: ReactNode | undefined;
}

/** Something the person should know here: a word, a shape and a colour. */
export function Notice({ tone = 'info', title, live, actions, className, children }: NoticeProps) {
  const { box, icon: Icon, ink, word } = tones[tone];
  return (
    <div
      role={live ? (tone === 'danger' ? 'alert' : 'status') : undefined}
      className={classNames('flex gap-3 rounded border-l-4 px-3.5 py-2.5', box, className)}
    >
      <Icon size={20} aria-hidden="true" className={classNames('mt-0.5 shrink-0', ink)} />
      <div className="min-w-0 grow">
        <span className="sr-only">{word}: </span>
        {title && <strong className="font-semibold">{title} </strong>}
        {children}
        {actions && <div className="mt-2 flex flex-wrap gap-2">{actions}</div>}
      </div>
    </div>
  );
}
