import type { Metadata } from 'next';
import Link from 'next/link';
import { ActionForm, type FormField } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { currentViewer } from '@/lib/auth/viewer';
import { askToComeIn, joinAtOnce } from './actions';

export const metadata: Metadata = { title: 'Join a class' };

const word: FormField = {
  name: 'word',
  label: 'Joining word',
  autoComplete: 'off',
  hint: 'Your instructor has it. It looks like rowan-spokeshave-0417.',
  required: true,
};

export default async function JoinPage() {
  const viewer = await currentViewer();
  return (
    <Page width="narrow">
      <PageHeading>Join a class</PageHeading>
      {viewer ? (
        <>
          <p className="mb-6 max-w-measure">
            You are signed in as {viewer.name} and join with this account.
          </p>
          <ActionForm action={joinAtOnce} submit="Join" fields={[word]} />
        </>
      ) : (
        <>
          <p className="mb-6 max-w-measure">
            With the joining word of a class you come in by yourself: you get a letter, follow the
            link in it and choose a password. Have an account already?{' '}
            <Link href="/sign-in?from=/join" prefetch={false} className="link">
              Sign in first
            </Link>{' '}
            and you join at once.
          </p>
          <ActionForm
            action={askToComeIn}
            submit="Send me the letter"
            fields={[
              word,
              { name: 'name', label: 'Your name', autoComplete: 'name', required: true },
              {
                name: 'email',
                label: 'E-mail',
                type: 'email',
                autoComplete: 'email',
                required: true,
              },
            ]}
          />
        </>
      )}
    </Page>
  );
}
