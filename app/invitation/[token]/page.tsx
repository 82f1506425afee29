import type { Metadata } from 'next';
import { DeadLink } from '@/app/_components/dead-link';
import { ActionForm } from '@/components/ui/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { currentViewer } from '@/lib/auth/viewer';
import { now } from '@/lib/clock';
import { findInvitation } from '@/lib/data/entry/accept-invitation';
import { acceptHere, comeIn } from './actions';
import { accountFields } from './_components/account-fields';
import { invitationSentence } from './_components/invitation-sentence';

// The address of this page opens a door: where a link leads on from it, only the site is named.
export const metadata: Metadata = { title: 'Invitation', referrer: 'strict-origin' };

interface InvitationPageProps {
  readonly params: Promise<{ readonly token: string }>;
}

export default async function InvitationPage({ params }: InvitationPageProps) {
  const { token } = await params;
  const [found, viewer] = await Promise.all([
    findInvitation({ by: 'link', secret: token }, now()),
    currentViewer(),
  ]);
  if (found === null) {
    return (
      <DeadLink>
        An invitation works once, for seven days, and until it is withdrawn; with a joining word,
        for a day and while joining is open. If you have come in with it, sign in. If not, ask
        whoever sent it to send it again.
      </DeadLink>
    );
  }
  return (
    <Page width="narrow">
      <PageHeading eyebrow={found.email}>{found.className ?? 'Come in'}</PageHeading>
      <p className="mb-6 max-w-measure">{invitationSentence(found)}</p>
      {found.hasAccount && viewer === null ? (
        <>
          <p className="mb-6 max-w-measure">
            You have an account with this address. Sign in and you can accept.
          </p>
          <ButtonLink href={`/sign-in?from=/invitation/${encodeURIComponent(token)}`}>
            Sign in
          </ButtonLink>
        </>
      ) : null}
      {viewer ? (
        <ActionForm action={acceptHere.bind(null, token)} fields={[]} submit="Accept">
          <p className="mb-6 max-w-measure">You accept as {viewer.name}.</p>
        </ActionForm>
      ) : null}
      {!found.hasAccount && viewer === null ? (
        <ActionForm
          action={comeIn.bind(null, token)}
          fields={accountFields(found.name)}
          submit="Come in"
        />
      ) : null}
    </Page>
  );
}
