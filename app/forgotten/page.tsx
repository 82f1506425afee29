import type { Metadata } from 'next';
import { ActionForm } from '@/components/ui/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { askReset } from './actions';

export const metadata: Metadata = { title: 'Forgotten password' };

export default function ForgottenPage() {
  return (
    <Page width="narrow">
      <PageHeading>Forgotten your password?</PageHeading>
      <p className="mb-6 max-w-measure">
        Type the address of your account. A letter goes to it with a link that sets a new password:
        it works once, and for half an hour.
      </p>
      <ActionForm
        action={askReset}
        submit="Send me the letter"
        fields={[
          {
            name: 'email',
            label: 'E-mail',
            type: 'email',
            autoComplete: 'username',
            required: true,
          },
        ]}
      />
      <p className="mt-8 mb-6 max-w-measure text-pencil">
        Nothing in the post after some minutes? Look among the unwanted mail, then ask whoever looks
        after Hornbeam in your workshop: they can make a link for you. Your answers and your pegs
        are kept meanwhile.
      </p>
      <ButtonLink href="/sign-in" variant="secondary">
        Back to signing in
      </ButtonLink>
    </Page>
  );
}
