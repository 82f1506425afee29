import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import { wantsClassMail } from '@/lib/data/mail-preference';
import type { Viewer } from '@/lib/policy/viewer';
import { saveMailPreference } from './mail-actions';

/** Whether letters about one's classes come. */
export async function MailPreference({ viewer }: Readonly<{ viewer: Viewer }>) {
  const wants = await wantsClassMail(viewer);
  return (
    <Section title="Letters">
      <ActionForm
        action={saveMailPreference}
        submit="Save"
        variant="secondary"
        fields={[
          {
            name: 'classMail',
            label: 'Letters about your classes',
            value: wants ? 'yes' : 'no',
            options: [
              { value: 'yes', label: 'Yes' },
              { value: 'no', label: 'No' },
            ],
            hint: 'What is set, what is due tomorrow, comments, and for instructors how the week went. What your account itself needs always comes.',
          },
        ]}
      />
    </Section>
  );
}
