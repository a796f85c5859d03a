import type { ButtonHTMLAttributes } from 'react';
import { classNames } from '../lib/class-names.ts';
import { buttonLook, type ButtonLook } from './button-look.ts';

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement>, ButtonLook {
  /** While it sends: it keeps the focus, says so, and cannot be pressed again. */
  busy?: boolean | undefined;
}

export function Button(props: ButtonProps) {
  const { tone, size, busy, className, children, type = 'button', onClick, ...rest } = props;
  return (
    <button
      {...rest}
      type={type}
      aria-disabled={busy || undefined}
      onClick={busy ? (event) => event.preventDefault() : onClick}
      className={classNames(
        buttonLook({ tone, size }),
        busy && 'cursor-progress opacity-70',
        className,
      )}
    >
      {children}
      {busy && <span className="sr-only">, sending</span>}
    </button>
  );
}
