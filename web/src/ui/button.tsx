import type { ComponentProps, ReactNode } from 'react';
import { Link } from 'react-router-dom';

type Kind = 'primary' | 'quiet' | 'danger' | 'plain';

const looks: Record<Kind, string> = {
  primary: 'border-copper bg-copper text-on-copper hover:brightness-110',
  quiet: 'border-ink bg-transparent text-ink hover:bg-wash',
  danger: 'border-unfit bg-transparent text-unfit hover:bg-wash',
  plain: 'border-transparent bg-transparent text-copper underline underline-offset-4 hover:bg-wash',
};
const base =
  'inline-flex min-h-11 items-center justify-center gap-2 rounded border px-4 py-2 text-center leading-6 font-medium transition-[filter,background-color] duration-150 disabled:cursor-not-allowed disabled:opacity-60';

interface ButtonProps extends Omit<ComponentProps<'button'>, 'className'> {
  kind?: Kind;
  /** Shows that what was pressed is under way, and keeps it from being pressed twice. */
  isPending?: boolean;
  isWide?: boolean;
}

/** A button. `primary` is the one thing to do on a page. */
export function Button({
  kind = 'primary',
  isPending = false,
  isWide = false,
  children,
  disabled,
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    // The kind of button is decided by its caller and is never left to the browser.
    // oxlint-disable-next-line react/button-has-type
    <button
      type={type}
      {...rest}
      disabled={(disabled ?? false) || isPending}
      aria-busy={isPending}
      className={`${base} ${looks[kind]} ${isWide ? 'w-full' : ''}`}
    >
      {children}
      {isPending && <span aria-hidden="true">…</span>}
    </button>
  );
}

/** A link that looks like a button, for going somewhere. */
export function ButtonLink({
  to,
  kind = 'primary',
  isWide = false,
  children,
}: {
  to: string;
  kind?: Kind;
  isWide?: boolean;
  children: ReactNode;
}) {
  return (
    <Link to={to} className={`${base} ${looks[kind]} ${isWide ? 'w-full' : ''} no-underline`}>
      {children}
    </Link>
  );
}
