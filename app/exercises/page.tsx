import type { Metadata } from 'next';
import Link from 'next/link';
import { forbidden } from 'next/navigation';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listKeys } from '@/lib/data/exercise-key';

export const metadata: Metadata = { title: 'Answers and slips' };

export default async function ExercisesPage() {
  const keys = listKeys(await requireViewer());
  if (keys === null) forbidden();
  return (
    <Page>
      <PageHeading>Answers and slips</PageHeading>
      <p className="mb-8 max-w-measure text-pencil">
        Each opens with numbers drawn for this look. Learners cannot reach these pages, and theirs
        hold no trace of them.
      </p>
      {keys.map((lesson) => (
        <Section key={lesson.lessonId} title={lesson.title}>
          <ul>
            {lesson.exercises.map(({ exerciseId, title }) => (
              <li key={exerciseId} className="border-b border-rule">
                <Link
                  href={`/exercises/${exerciseId}/key`}
                  prefetch={false}
                  className="link link-target"
                >
                  {title}
                </Link>
              </li>
            ))}
          </ul>
        </Section>
      ))}
    </Page>
  );
}
