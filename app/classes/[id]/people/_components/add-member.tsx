import { ActionForm } from '@/components/ui/action-form';
import type { Member } from '@/lib/data/class-people';
import { listPeople } from '@/lib/data/people-list';
import type { Viewer } from '@/lib/policy/viewer';
import { putIn } from '../actions';

interface AddMemberProps {
  readonly classId: string;
  readonly viewer: Viewer;
  readonly members: readonly Member[];
}

/** Puts somebody who has an account into the class, as a learner or to teach it. */
export async function AddMember({ classId, viewer, members }: AddMemberProps) {
  const inside = new Set(members.map(({ personId }) => personId));
  const people = (await listPeople(viewer)).filter(
    (person) => !person.disabled && !inside.has(person.personId),
  );
  return (
    <ActionForm
      action={putIn.bind(null, classId)}
      submit="Put into the class"
      variant="secondary"
      fields={[
        {
          name: 'email',
          label: 'Who',
          options: people.flatMap(({ name, email }) =>
            email === null ? [] : [{ value: email, label: `${name} (${email})` }],
          ),
        },
        {
          name: 'role',
          label: 'As',
          options: [
            { value: 'learner', label: 'learner' },
            { value: 'instructor', label: 'instructor' },
          ],
        },
      ]}
    />
  );
}
