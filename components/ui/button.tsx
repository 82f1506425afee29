import clsx from 'clsx';
import Link from 'next/link';
import type { ComponentProps } from 'react';

type Variant = 'primary' | 'secondary' | 'quiet' | 'danger';

const variants: Record<Variant, string> = {
  primary: 'border-chalk bg-chalk text-paper hover:border-ink hover:bg-ink',
  secondary: 'border-chalk bg-transparent text-chalk hover:bg-board',
  quiet: 'border-pencil bg-paper text-ink hover:bg-board',
  danger: 'border-madder bg-transparent text-madder hover:bg-board',
};

const shape =
  'inline-flex min-h-11 min-w-11 items-center justify-center gap-2 rounded border px-4 py-2 text-center text-base leading-tight font-semibold no-underline disabled:cursor-not-allowed disabled:border-rule disabled:bg-board disabled:text-pencil aria-disabled:cursor-not-allowed print:hidden';

/** The look of a button, for elements that only this file cannot make. */
export function buttonClass(variant: Variant = 'primary', extra?: string): string {
  return clsx(shape, variants[variant], extra);
}

type ButtonProps = ComponentProps<'button'> & { readonly variant?: Variant };

/** A button; `type` is `button` unless said otherwise, so that it never sends a form by chance. */
export function Button({ variant = 'primary', className, type = 'button', ...rest }: ButtonProps) {
  return <button type={type} className={buttonClass(variant, className)} {...rest} />;
}

type ButtonLinkProps = ComponentProps<typeof Link> & { readonly variant?: Variant };

/**
 * A link that looks like a button. It is not prefetched: what it leads to may need an account, and
 * a redirect seen while signed out would be kept after signing in.
 */
export function ButtonLink({ variant = 'primary', className, ...rest }: ButtonLinkProps) {
  return <Link prefetch={false} className={buttonClass(variant, className)} {...rest} />;
}
