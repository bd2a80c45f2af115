import type { ComponentProps } from 'react';
import { Link } from 'react-router-dom';
import { type ButtonLook, buttonLook } from './button-look.ts';

interface LinkButtonProps extends ComponentProps<typeof Link> {
  readonly look?: ButtonLook;
}

/** A link that reads as the action of a page. For a file, give `reloadDocument` and `download`. */
export function LinkButton({ look = 'main', className = '', ...rest }: LinkButtonProps) {
  return <Link className={`${buttonLook(look)} ${className}`} {...rest} />;
}
