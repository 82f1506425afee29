import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { Notice } from '@/components/ui/notice';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { currentViewer } from '@/lib/auth/viewer';
import { homeOf } from '../_components/navigation';
import { safePath } from './_components/safe-path';
import { SignInForm } from './_components/sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

interface SignInPageProps {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { from } = await searchParams;
  const next = safePath(from);
  const viewer = await currentViewer();
  if (viewer) redirect(next ?? homeOf(viewer));
  return (
    <Page width="narrow">
      <PageHeading>Sign in</PageHeading>
      {next ? (
        <Notice title="That page needs you to be signed in.">
          If you were signed in before, your session has ended. Nothing is lost: you go on where you
          were, and answers that wait on this device are sent then.
        </Notice>
      ) : null}
      <SignInForm next={next ?? '/home'} />
      <p className="mt-8 max-w-measure text-pencil">
        <Link href="/forgotten" prefetch={false} className="link">
          Forgotten your password?
        </Link>{' '}
        No account yet? You come in with an invitation from your workshop, or{' '}
        <Link href="/join" prefetch={false} className="link">
          with the joining word of a class
        </Link>
        . The lessons are open to read without.
      </p>
    </Page>
  );
}
