import { Link, type LinkProps } from 'react-router-dom';
import { classNames } from '../lib/class-names.ts';

export function TextLink({ className, ...rest }: LinkProps) {
  return (
    <Link
      {...rest}
      className={classNames(
        'font-semibold text-verdigris underline decoration-1 underline-offset-3 hover:decoration-2',
        className,
      )}
    />
  );
}
