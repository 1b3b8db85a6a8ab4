import { LoaderCircle, type LucideIcon } from 'lucide-react';
import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './classNames';

export type ButtonKind = 'primary' | 'plain' | 'destructive' | 'quiet';

export interface ButtonLook {
  kind?: ButtonKind;
  small?: boolean;
  icon?: LucideIcon;
  children: ReactNode;
}

const kindClass: Record<ButtonKind, string> = {
  primary: 'btn-primary',
  plain: '',
  destructive: 'btn-destructive',
  quiet: 'btn-quiet',
};

export function buttonClass(kind: ButtonKind = 'plain', small = false, more?: string): string {
  return classNames('btn', kindClass[kind], small && 'btn-small', more);
}

interface ButtonProps extends ButtonLook, Omit<ComponentProps<'button'>, 'children'> {
  /** Says what is being done, such as "Saving…"; the button then takes no press but keeps the focus. */
  busy?: string | false;
}

export function Button({
  kind,
  small,
  icon: Icon,
  busy,
  children,
  className,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      {...rest}
      className={buttonClass(kind, small, className)}
      aria-disabled={busy ? true : rest['aria-disabled']}
      onClick={busy ? (event) => event.preventDefault() : onClick}
    >
      {busy ? (
        <LoaderCircle size={16} aria-hidden className="animate-spin" />
      ) : (
        Icon && <Icon size={16} aria-hidden className="shrink-0" />
      )}
      {busy || children}
    </button>
  );
}

interface ButtonLinkProps extends ButtonLook, Omit<ComponentProps<'a'>, 'children'> {
  href: string;
}

export function ButtonLink({
  kind,
  small,
  icon: Icon,
  children,
  className,
  ...rest
}: ButtonLinkProps) {
  return (
    <a {...rest} className={buttonClass(kind, small, className)}>
      {Icon && <Icon size={16} aria-hidden className="shrink-0" />}
      {children}
    </a>
  );
}
