import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';

export const metadata: Metadata = { title: 'Not yours' };

export default function Forbidden() {
  return (
    <Page width="narrow">
      <PageHeading>This page is not yours to see</PageHeading>
      <p className="mb-6 max-w-measure">
        It belongs to people with other work here. If it should be yours, ask whoever looks after
        Hornbeam in your workshop. Nothing of your own has changed.
      </p>
      <ButtonLink href="/home">Go to where your work is</ButtonLink>
    </Page>
  );
}
