'use client';

import clsx from 'clsx';
import Link, { useLinkStatus } from 'next/link';
import { usePathname } from 'next/navigation';
import { isCurrent, type NavigationLink } from './navigation';

interface NavLinksProps {
  readonly links: readonly NavigationLink[];
  /** Names the landmark for screen readers. */
  readonly label: string;
  readonly className?: string;
}

/** Links to the parts of the site; the part being shown is underlined in brass and said aloud. */
export function NavLinks({ links, label, className }: NavLinksProps) {
  const pathname = usePathname();
  return (
    <nav aria-label={label} className={className}>
      <ul className="flex flex-wrap gap-x-5">
        {links.map(({ href, label: text }) => {
          const current = isCurrent(href, pathname);
          return (
            <li key={href}>
              <Link
                href={href}
                prefetch={false}
                aria-current={current ? 'page' : undefined}
                className={clsx(
                  'inline-flex min-h-11 items-center border-b-2 text-ink no-underline hover:border-pencil',
                  current ? 'border-brass' : 'border-transparent',
                )}
              >
                <LinkText text={text} />
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}

/** The text of a link, dimmed while its page is on the way. */
function LinkText({ text }: Readonly<{ text: string }>) {
  const { pending } = useLinkStatus();
  return <span className={clsx(pending && 'text-pencil italic')}>{text}</span>;
}
