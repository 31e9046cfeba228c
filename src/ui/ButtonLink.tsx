import { Link, type LinkProps } from 'react-router';
import { buttonClass, type ButtonLook } from './buttonClass.ts';

/** A link that looks like a button: it goes somewhere, it does nothing. */
export function ButtonLink({
  look = 'plain',
  className = '',
  ...rest
}: LinkProps & { look?: ButtonLook }) {
  return <Link {...rest} className={`${buttonClass(look)} ${className}`} />;
}
