import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { currentViewer } from '@/lib/auth/viewer';
import { SignOut } from '../account/_components/sign-out';

export const metadata: Metadata = { title: 'Sign out' };

export default async function SignOutPage() {
  const viewer = await currentViewer();
  if (viewer === null) redirect('/');
  return (
    <Page width="narrow">
      <PageHeading>Sign out</PageHeading>
      <p className="mb-6 max-w-measure">You are signed in as {viewer.name}.</p>
      <SignOut personId={viewer.personId} />
    </Page>
  );
}
