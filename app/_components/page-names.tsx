import { TextLink } from './link';

export interface PageName {
  words: string;
  href: string;
  current: boolean;
}

/** The names of the pages beside this one; the present one is strong and stands on a lamp rule. */
export function PageNames({ names, className }: { names: readonly PageName[]; className?: string }) {
  return (
    <nav
      aria-label="Pages"
      className={`-mb-px flex flex-wrap gap-x-7 pt-3 max-md:gap-x-5 max-md:pt-1 ${className ?? ''}`}
    >
      {names.map((name) => (
        <TextLink
          key={name.words}
          href={name.href}
          look="plain"
          className={`inline-flex min-h-8 touch-44 items-center border-b-[3px] pt-1 pb-1.5 text-14 ${name.current ? 'border-b-lamp font-semibold' : 'border-b-transparent text-ink-soft hover:text-ink'}`}
          {...(name.current && { 'aria-current': 'page' as const })}
        >
          {name.words}
        </TextLink>
      ))}
    </nav>
  );
}
