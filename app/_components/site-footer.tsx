import Link from 'next/link';
import { Mark } from '@/components/ui/wordmark';

const links = [
  { href: '/lessons', label: 'Lessons' },
  { href: '/by-motion', label: 'By motion' },
  { href: '/for-instructors', label: 'For instructors' },
];

/** The foot of every page. */
export function SiteFooter() {
  return (
    <footer className="border-t border-rule px-4 py-6 sm:px-6 lg:px-10 print:hidden">
      <div className="mx-auto flex max-w-page flex-wrap items-center gap-x-8 gap-y-2 text-base text-pencil">
        <p className="flex max-w-measure items-center gap-3">
          <Mark size={22} />
          Named for the timber that cogs are cut from.
        </p>
        <ul className="flex flex-wrap gap-x-5 sm:ml-auto">
          {links.map(({ href, label }) => (
            <li key={href}>
              <Link href={href} prefetch={false} className="link link-target">
                {label}
              </Link>
            </li>
          ))}
        </ul>
      </div>
    </footer>
  );
}
