import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';

export const metadata: Metadata = { title: 'Forgotten password' };

export default function ForgottenPage() {
  return (
    <Page width="narrow">
      <PageHeading>Forgotten your password?</PageHeading>
      <p className="mb-3 max-w-measure">
        Ask whoever looks after Hornbeam in your workshop. They make a link for you that sets a new
        password; it works once, and for seven days.
      </p>
      <p className="mb-6 max-w-measure text-pencil">
        Your answers and your pegs are kept meanwhile. Setting a new password signs you out on every
        device.
      </p>
      <ButtonLink href="/sign-in" variant="secondary">
        Back to signing in
      </ButtonLink>
    </Page>
  );
}
