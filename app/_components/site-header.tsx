import Link from 'next/link';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { Wordmark } from '@/components/ui/wordmark';
import { NavLinks } from './nav-links';
import { linksFor, type NavigationViewer } from './navigation';
import { UnitSwitch } from './unit-switch';

interface SiteHeaderProps {
  readonly viewer: NavigationViewer | null;
  readonly units: UnitSystem;
}

const account = [{ href: '/account', label: 'Account' }];
const signIn = [{ href: '/sign-in', label: 'Sign in' }];

/** The head of every page: the wordmark, the parts of the site, the units and the account. */
export function SiteHeader({ viewer, units }: SiteHeaderProps) {
  return (
    <header className="border-b border-rule px-4 sm:px-6 lg:px-10 print:hidden">
      <div className="flex flex-wrap items-center gap-x-7 pt-2 sm:pt-3.5 sm:pb-3">
        <Link href="/" className="inline-flex min-h-11 items-center no-underline" prefetch={false}>
          <Wordmark />
        </Link>
        <NavLinks
          links={linksFor(viewer)}
          label="Main"
          className="order-last w-full sm:order-none sm:w-auto"
        />
        <div className="ml-auto flex items-center gap-4">
          <UnitSwitch units={units} />
          <NavLinks links={viewer ? account : signIn} label="Account" />
        </div>
      </div>
    </header>
  );
}
