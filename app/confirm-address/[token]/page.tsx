import type { Metadata } from 'next';
import { DeadLink } from '@/app/_components/dead-link';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { now } from '@/lib/clock';
import { findNewAddress } from '@/lib/data/entry/confirm-address';
import { confirmAddress } from './actions';

export const metadata: Metadata = { title: 'Confirm an address', referrer: 'strict-origin' };

interface ConfirmAddressPageProps {
  readonly params: Promise<{ readonly token: string }>;
}

export default async function ConfirmAddressPage({ params }: ConfirmAddressPageProps) {
  const { token } = await params;
  const email = await findNewAddress({ by: 'link', secret: token }, now());
  if (email === null) {
    return (
      <DeadLink>
        A link that changes an address works once, and for half an hour. If the change is still to
        be made, ask for it again on your account page.
      </DeadLink>
    );
  }
  return (
    <Page width="narrow">
      <PageHeading>Your new address</PageHeading>
      <p className="mb-6 max-w-measure">
        You sign in with <strong>{email}</strong> from now on, and letters go there. The old address
        gets one last letter that says so.
      </p>
      <ActionForm action={confirmAddress.bind(null, token)} fields={[]} submit="Use this address" />
    </Page>
  );
}
