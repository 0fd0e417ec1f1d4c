import type { ButtonHTMLAttributes } from 'react';
import { Link, type LinkProps } from 'react-router-dom';

type Kind = 'main' | 'plain' | 'quiet' | 'grave';

const base = 'inline-flex items-center justify-center gap-2 rounded-nib text-sm font-semibold no-underline disabled:cursor-not-allowed disabled:opacity-60';
const looks: Record<Kind, string> = {
  main: 'min-h-10 px-4 bg-copper text-paper hover:bg-copper-deep',
  plain: 'min-h-10 px-4 border border-edge bg-sheet text-ink hover:border-ink',
  quiet: 'min-h-8 px-1.5 text-copper underline decoration-1 underline-offset-4 hover:decoration-2',
  grave: 'min-h-10 px-4 border border-plum bg-sheet text-plum hover:bg-plum hover:text-paper',
};

type ButtonProps = ButtonHTMLAttributes<HTMLButtonElement> & { kind?: Kind };

export function Button({ kind = 'plain', type = 'button', className = '', ...rest }: ButtonProps) {
  return <button type={type} className={`${base} ${looks[kind]} ${className}`} {...rest} />;
}

export function LinkButton({ kind = 'plain', className = '', ...rest }: LinkProps & { kind?: Kind }) {
  return <Link className={`${base} ${looks[kind]} ${className}`} {...rest} />;
}
