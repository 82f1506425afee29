import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';

export const metadata: Metadata = { title: 'Not here' };

export default function NotFound() {
  return (
    <Page width="narrow">
      <PageHeading>There is nothing at this address</PageHeading>
      <p className="mb-6 max-w-measure">
        The link may be old or mistyped, or the page belongs to somebody else. Nothing of yours is
        lost.
      </p>
      <div className="flex flex-wrap gap-3">
        <ButtonLink href="/lessons">See the lessons</ButtonLink>
        <ButtonLink href="/" variant="secondary">
          Go to the front page
        </ButtonLink>
      </div>
    </Page>
  );
}
