import type { ButtonHTMLAttributes } from 'react';
import { buttonClass, type ButtonLook } from './buttonClass.ts';

type ButtonProps = ButtonHTMLAttributes<HTMLButtonElement> & { look?: ButtonLook; busy?: boolean };

/** A button; `busy` keeps it from being pressed twice and says so. */
export function Button({ look = 'plain', busy = false, className = '', ...rest }: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      disabled={rest.disabled === true || busy}
      aria-busy={busy || undefined}
      className={`${buttonClass(look)} ${className}`}
    />
  );
}
