import type { ReactNode } from 'react';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';

/** What stands where a link that works once has been used, or was never good. */
export function DeadLink({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <Page width="narrow">
      <PageHeading>This link is used up</PageHeading>
      <p className="mb-6 max-w-measure">{children}</p>
      <ButtonLink href="/sign-in">Sign in</ButtonLink>
    </Page>
  );
}
