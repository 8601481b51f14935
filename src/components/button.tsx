import type { ButtonHTMLAttributes, ReactNode } from 'react';
import { Link } from 'react-router-dom';

export type ButtonKind = 'scribe' | 'zinc' | 'plain' | 'quiet' | 'lead';
export type ButtonSize = 'usual' | 'small';

const kinds: Record<ButtonKind, string> = {
  scribe: 'border-scribe bg-scribe text-on-scribe',
  zinc: 'border-zinc bg-zinc text-on-zinc',
  plain: 'border-scribe bg-transparent text-scribe',
  quiet: 'border-edge bg-transparent text-ink',
  lead: 'border-lead bg-card text-lead',
};
const sizes: Record<ButtonSize, string> = { usual: 'px-4 py-[11px]', small: 'px-3 py-2' };

export function buttonClass(kind: ButtonKind, size: ButtonSize = 'usual', full = false): string {
  return `inline-flex ${full ? 'w-full' : ''} items-center justify-center gap-2 whitespace-nowrap rounded-edge border text-[15px]/none font-semibold no-underline transition-[filter] hover:brightness-92 aria-disabled:cursor-default aria-disabled:opacity-70 ${sizes[size]} ${kinds[kind]}`;
}

interface Manner {
  kind?: ButtonKind;
  size?: ButtonSize;
  /** As wide as what it stands in. */
  full?: boolean;
}

export type ButtonProps = Manner & Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'className' | 'type'> & { type?: 'button' | 'submit' };

export function Button({ kind = 'scribe', size = 'usual', full = false, type = 'button', ...rest }: ButtonProps) {
  const look = buttonClass(kind, size, full);
  return type === 'submit' ? <button type="submit" className={look} {...rest} /> : <button type="button" className={look} {...rest} />;
}

export interface ButtonLinkProps extends Manner {
  to: string;
  children: ReactNode;
  'aria-current'?: 'page' | 'true';
  /** For files and feeds, which the router must not take. */
  reload?: boolean;
}

export function ButtonLink({ kind = 'scribe', size = 'usual', full = false, to, reload = false, children, ...rest }: ButtonLinkProps) {
  return (
    <Link to={to} reloadDocument={reload} className={buttonClass(kind, size, full)} {...rest}>
      {children}
    </Link>
  );
}
