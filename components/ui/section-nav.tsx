'use client';

import clsx from 'clsx';
import Link from 'next/link';
import { usePathname } from 'next/navigation';

/** One part of a thing that is shown over several pages. */
export interface SectionLink {
  readonly href: string;
  readonly label: string;
}

interface SectionNavProps {
  readonly label: string;
  /** The first is the thing's own page; the others lie under it. */
  readonly links: readonly SectionLink[];
}

/** The way between the pages of one thing: the one being shown stands open to what is under it. */
export function SectionNav({ label, links }: SectionNavProps) {
  const pathname = usePathname();
  const current = [...links]
    .reverse()
    .find(({ href }) => pathname === href || pathname.startsWith(`${href}/`))?.href;
  return (
    <nav aria-label={label} className="mb-8 border-b border-pencil print:hidden">
      <ul className="-mb-px flex flex-wrap gap-x-1">
        {links.map(({ href, label: text }) => (
          <li key={href}>
            <Link
              href={href}
              prefetch={false}
              aria-current={href === current ? 'page' : undefined}
              className={clsx(
                'inline-flex min-h-11 items-center border border-b-0 px-3 no-underline sm:px-4',
                href === current
                  ? 'rounded-t border-pencil bg-paper font-semibold text-ink'
                  : 'border-transparent text-pencil hover:text-ink',
              )}
            >
              {text}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
