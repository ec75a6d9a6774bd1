import type { Route } from 'next';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { buttonLook } from './button-look';

interface TextLinkProps {
  href: string;
  children: ReactNode;
  /** `does`: solid rule; `opens`: dotted rule; `quiet`: words in a list of names; `plain`: no look of its own; `button`: the page's one way on. */
  look?: 'does' | 'opens' | 'quiet' | 'plain' | 'button';
  strong?: boolean;
  className?: string;
  'aria-current'?: 'page';
}

const LOOKS = {
  does: 'link-does inline-flex items-center min-h-6',
  opens: 'link-opens text-ink',
  quiet: 'text-ink-soft hover:text-ink',
  plain: '',
  button: buttonLook('solid'),
} as const;

/** A link inside the app, or out of it; what a link looks like says what it does. */
export function TextLink({ href, children, look = 'does', strong, className, ...rest }: TextLinkProps) {
  const style = `${LOOKS[look]} ${strong ? 'font-semibold' : ''} ${className ?? ''}`;
  if (/^https?:|^mailto:/.test(href)) {
    return (
      <a href={href} className={style} rel="noreferrer" {...rest}>
        {children}
      </a>
    );
  }
  return (
    <Link href={href as Route} className={style} {...rest}>
      {children}
    </Link>
  );
}
