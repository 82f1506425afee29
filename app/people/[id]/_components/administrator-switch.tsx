import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import type { PersonListed } from '@/lib/data/people-list';
import { makeAdmin, unmakeAdmin } from '../../actions';

/** Makes somebody an administrator, after saying what that means, or one no longer. */
export function AdministratorSwitch({ person }: Readonly<{ person: PersonListed }>) {
  if (person.disabled) return null;
  const { isAdministrator, name, personId } = person;
  return (
    <Section title="Administrator">
      <details>
        <summary className="link link-target">
          {isAdministrator ? 'Make them one no longer …' : 'Make them an administrator …'}
        </summary>
        <p className="mt-2 mb-4 max-w-measure">
          {isAdministrator
            ? `${name} looks after people and every class no longer, from this moment. One administrator always stays.`
            : `${name} looks after people and every class then, and may see everybody’s work, which is noted in the audit log.`}
        </p>
        <ActionForm
          action={(isAdministrator ? unmakeAdmin : makeAdmin).bind(null, personId)}
          fields={[]}
          submit={isAdministrator ? 'Administrator no longer' : `Make ${name} an administrator`}
          variant={isAdministrator ? 'danger' : 'secondary'}
        />
      </details>
    </Section>
  );
}
