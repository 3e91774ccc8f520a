import Link from 'next/link';
import type { ButtonHTMLAttributes, ComponentProps } from 'react';

type Look = { variant?: 'primary' | 'plain' };

export const buttonClass = ({ variant = 'plain' }: Look = {}) =>
  variant === 'primary' ? 'button button-primary' : 'button';

export function Button({
  variant,
  className = '',
  type = 'button',
  ...rest
}: ButtonHTMLAttributes<HTMLButtonElement> & Look) {
  return <button type={type} className={`${buttonClass({ variant })} ${className}`} {...rest} />;
}

/** A link that looks like a button, for a step that goes somewhere. */
export function ButtonLink({ variant, className = '', ...rest }: ComponentProps<typeof Link> & Look) {
  return <Link className={`${buttonClass({ variant })} ${className}`} {...rest} />;
}
