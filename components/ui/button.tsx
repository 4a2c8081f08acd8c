import Link from 'next/link';
import type { ComponentProps } from 'react';

/** strong: the one action a screen is for. plain: everything else. quiet: a word among words. danger: refuses or takes away. */
export type ButtonVariant = 'strong' | 'plain' | 'quiet' | 'danger';

const looks: Record<ButtonVariant, string> = {
  strong: 'border-blue bg-blue text-leaf hover:border-ink hover:bg-ink',
  plain: 'border-blue text-blue hover:bg-blue-wash',
  quiet: 'border-transparent text-blue underline hover:bg-blue-wash',
  danger: 'border-oxide text-oxide hover:bg-oxide-wash',
};

/** `small` is for rows of a table in the office; on the shop floor everything is 48 px high. */
export const buttonClass = (variant: ButtonVariant = 'plain', small = false, className = '') =>
  `inline-flex items-center justify-center rounded border-[1.5px] text-center font-medium disabled:cursor-not-allowed disabled:opacity-55 ${
    small ? 'min-h-9 px-3 text-sm' : 'min-h-12 px-5 py-1'
  } ${looks[variant]} ${className}`;

interface Look {
  variant?: ButtonVariant;
  small?: boolean;
}

export function Button({ variant, small, className, type = 'button', ...rest }: ComponentProps<'button'> & Look) {
  return <button type={type} className={buttonClass(variant, small, className)} {...rest} />;
}

export function LinkButton({ variant, small, className, ...rest }: ComponentProps<typeof Link> & Look) {
  return <Link className={buttonClass(variant, small, className)} {...rest} />;
}
