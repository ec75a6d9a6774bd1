import { TextLink } from './link';

/** The same three ways on every page. */
export function PageFoot() {
  return (
    <footer className="flex flex-wrap gap-x-6 gap-y-1 mt-10 border-t border-line py-5 text-12 text-ink-soft print:hidden">
      <TextLink href="/sources" look="opens" className="inline-flex min-h-6 touch-44 items-center text-ink-soft">
        Where the figures come from
      </TextLink>
      <TextLink href="/stored" look="opens" className="inline-flex min-h-6 touch-44 items-center text-ink-soft">
        What is stored
      </TextLink>
      <span className="inline-flex min-h-6 items-center">
        Plans are estimates; local codes, makers’ instructions and a licensed electrician come first.
      </span>
    </footer>
  );
}
