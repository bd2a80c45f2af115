import type { ComponentProps } from 'react';
import { type ButtonLook, buttonLook } from './button-look.ts';

interface ButtonProps extends ComponentProps<'button'> {
  readonly look?: ButtonLook;
}

export function Button({ look = 'line', type = 'button', className = '', ...rest }: ButtonProps) {
  return <button type={type} className={`${buttonLook(look)} ${className}`} {...rest} />;
}
