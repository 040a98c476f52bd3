import { type Route } from 'next';
import Link from 'next/link';
import { type ComponentProps, type ReactNode } from 'react';

export type ButtonLook = 'primary' | 'quiet' | 'destructive' | 'plain';

const looks: Record<ButtonLook, string> = {
  primary: 'bg-spruce text-on-spruce hover:bg-spruce-strong shadow-[inset_0_-3px_0_rgb(0_0_0/0.22)]',
  quiet: 'bg-snow text-spruce border-2 border-spruce hover:bg-inset',
  destructive: 'bg-ember text-on-ember shadow-[inset_0_-3px_0_rgb(0_0_0/0.22)] hover:brightness-90',
  plain: 'text-spruce in-[.on-roof]:text-on-roof underline underline-offset-4 hover:decoration-2 px-2!',
};

export const buttonClass = (look: ButtonLook = 'primary', wide = false) =>
  `inline-flex min-h-12 items-center justify-center gap-2 rounded-md px-5 py-2 text-center font-semibold leading-tight no-underline transition-colors disabled:opacity-60 disabled:cursor-not-allowed ${wide ? 'w-full' : 'sm:justify-self-start'} ${looks[look]}`;

type ButtonProps = Omit<ComponentProps<'button'>, 'className'> & {
  look?: ButtonLook;
  /** Fills its row. */
  wide?: boolean;
  pending?: boolean;
  pendingLabel?: ReactNode;
};

/** While pending it stays focusable, says so, and cannot be pressed twice. */
export function Button({ look = 'primary', wide = false, pending = false, pendingLabel, type = 'button', children, onClick, ...rest }: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      aria-disabled={pending || undefined}
      onClick={pending ? (event) => event.preventDefault() : onClick}
      className={`${buttonClass(look, wide)} ${pending ? 'opacity-70' : ''}`}
    >
      {pending ? (pendingLabel ?? children) : children}
    </button>
  );
}

type LinkButtonProps = { href: string; look?: ButtonLook; wide?: boolean; children: ReactNode; prefetch?: boolean };

export function LinkButton({ href, look = 'primary', wide = false, children, prefetch }: LinkButtonProps) {
  return (
    <Link href={href as Route} prefetch={prefetch} className={buttonClass(look, wide)}>
      {children}
    </Link>
  );
}
