import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { ActionForm } from '@/components/ui/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { findSubscription } from '@/lib/data/entry/unsubscribe';
import { endClassMail } from './actions';

export const metadata: Metadata = { title: 'Letters about your classes', referrer: 'no-referrer' };

interface UnsubscribePageProps {
  readonly params: Promise<{ readonly token: string }>;
}

export default async function UnsubscribePage({ params }: UnsubscribePageProps) {
  const { token } = await params;
  const wanted = await findSubscription({ by: 'unsubscribe', token });
  if (wanted === null) notFound();
  return (
    <Page width="narrow">
      <PageHeading>Letters about your classes</PageHeading>
      <p className="mb-6 max-w-measure">
        {wanted
          ? 'They say what is set, what is due tomorrow, and when somebody has commented on your work; to instructors, how the week went.'
          : 'You get no letters about your classes.'}
      </p>
      {wanted ? (
        <ActionForm action={endClassMail.bind(null, token)} fields={[]} submit="No more of these" />
      ) : null}
      <p className="mt-6 max-w-measure text-pencil">
        What your account itself needs, such as a link to a new password, still comes. You can
        change your mind on your account’s page.
      </p>
      <ButtonLink href="/account" variant="secondary" className="mt-6">
        Your account
      </ButtonLink>
    </Page>
  );
}
