import { Link, type LinkProps } from 'react-router-dom';
import { classNames } from '../lib/class-names.ts';
import { buttonLook, type ButtonLook } from './button-look.ts';

export function LinkButton({ tone, size, className, ...rest }: LinkProps & ButtonLook) {
  return <Link {...rest} className={classNames(buttonLook({ tone, size }), className as string)} />;
}
