import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { PegList } from '@/components/progress/peg-list';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Empty, Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findLearnerInClass } from '@/lib/data/class-work';
import { AttemptsTable } from './_components/attempts-table';
import { WorkTalk } from './_components/work-talk';

export const metadata: Metadata = { title: 'Learner' };

interface LearnerPageProps {
  readonly params: Promise<{ readonly id: string; readonly learnerId: string }>;
}

export default async function LearnerPage({ params }: LearnerPageProps) {
  const { id, learnerId } = await params;
  const learner = await findLearnerInClass(await requireViewer(), id, learnerId);
  if (learner === null) notFound();
  return (
    <Page>
      <PageHeading
        eyebrow={
          <Link href={`/classes/${id}`} prefetch={false} className="link link-target">
            {learner.className}
          </Link>
        }
      >
        {learner.name}
      </PageHeading>
      <div className="grid gap-x-11 lg:grid-cols-[1fr_1fr]">
        <Section title="Pegs">
          {learner.lessons.length === 0 ? (
            <Empty title="Nothing is set to this class yet">
              The pegs of the lessons that you set appear here.
            </Empty>
          ) : null}
          {learner.lessons.map((lesson) => (
            <div key={lesson.lessonId} className="mb-6">
              <h3 className="mb-2">{lesson.title}</h3>
              <PegList pegs={lesson.pegs} />
            </div>
          ))}
        </Section>
        <div className="min-w-0">
          {learner.work.length === 0 ? null : (
            <Section title="Set to them">
              <WorkTalk learner={learner} />
            </Section>
          )}
          <Section title="Answers for this class">
            <AttemptsTable learner={learner} />
          </Section>
        </div>
      </div>
    </Page>
  );
}
