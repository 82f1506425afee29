import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import type { PersonListed } from '@/lib/data/people-list';
import { disable, enable } from '../../actions';

interface AccountSwitchProps {
  readonly person: PersonListed;
  /** Whether it is the account of whoever looks: nobody shuts themselves out. */
  readonly own: boolean;
}

/** Disables an account, after saying what that does, or lets it in again. */
export function AccountSwitch({ person, own }: AccountSwitchProps) {
  if (own) return null;
  if (person.disabled) {
    return (
      <Section title="Disabled">
        <ActionForm action={enable.bind(null, person.personId)} fields={[]} submit="Let in again" />
      </Section>
    );
  }
  return (
    <Section title="Disable">
      <details>
        <summary className="link link-target">Disable this account …</summary>
        <p className="mt-2 mb-4 max-w-measure">
          {person.name} is signed out everywhere at once and cannot sign in. Their work and their
          classes stay as they are, and you can let them in again.
        </p>
        <ActionForm
          action={disable.bind(null, person.personId)}
          fields={[]}
          submit={`Disable ${person.name}`}
          variant="danger"
        />
      </details>
    </Section>
  );
}
