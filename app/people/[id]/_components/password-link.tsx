import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import type { PersonListed } from '@/lib/data/people-list';
import { makeLink } from '../../actions';

/** A new link to somebody's password: by letter, and shown once to be handed over. */
export function PasswordLink({ person }: Readonly<{ person: PersonListed }>) {
  return (
    <Section title={person.hasPassword ? 'Forgotten password' : 'First password'}>
      <p className="mb-4 max-w-measure text-pencil">
        A letter brings a link that sets a new password. It is shown to you too, once, to hand over
        where letters do not arrive.
      </p>
      <ActionForm
        action={makeLink.bind(null, person.personId)}
        fields={[]}
        submit="Make a new link"
        variant="secondary"
      />
    </Section>
  );
}
