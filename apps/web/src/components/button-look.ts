export interface ButtonLook {
  /** `primary`: the one main action of a place; `danger`: what cannot be undone. */
  tone?: 'primary' | 'secondary' | 'quiet' | 'danger' | undefined;
  /** `bench`: for one thumb and wet hands. */
  size?: 'normal' | 'bench' | undefined;
}

const tones = {
  primary:
    'bg-verdigris text-card border-verdigris hover:bg-verdigris-deep hover:border-verdigris-deep',
  secondary: 'bg-card text-ink border-edge hover:bg-manila',
  quiet: 'bg-transparent text-verdigris border-transparent hover:bg-verdigris-pale',
  danger: 'bg-oxblood text-card border-oxblood hover:bg-oxblood-deep hover:border-oxblood-deep',
};

const sizes = {
  normal: 'min-h-9 px-3.5 py-1',
  bench: 'min-h-14 px-5 py-2 text-lg',
};

/** How a button looks, for a link that acts like one as well. */
export function buttonLook({ tone = 'secondary', size = 'normal' }: ButtonLook): string {
  return [
    'inline-flex items-center justify-center gap-2 rounded border font-semibold no-underline select-none',
    'transition-colors disabled:cursor-not-allowed disabled:opacity-60 no-print',
    tones[tone],
    sizes[size],
  ].join(' ');
}
