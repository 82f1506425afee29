import 'katex/dist/katex.min.css';
import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { BenchLockProvider } from '@/components/lesson/bench-lock';
import { RuleMargin } from '@/components/lesson/rule-margin';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { documents } from '@/content/lessons/documents';
import { findLesson, lessonPath } from '@/content/lessons/front-matter';
import { readerUnits } from '@/lib/auth/reader-units';
import { currentViewer } from '@/lib/auth/viewer';
import { lessonNames } from './_components/lesson-names';
import { findLessonWork } from './_components/lesson-work';

type Props = PageProps<'/lessons/[unit]/[lesson]'>;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { unit, lesson: id } = await params;
  const lesson = findLesson(unit, id);
  return lesson === null ? {} : { title: lesson.title, description: lesson.summary };
}

export default async function LessonPage({ params }: Props) {
  const { unit, lesson: id } = await params;
  const lesson = findLesson(unit, id);
  const load = documents.get(id);
  if (lesson === null || load === undefined) notFound();
  const [viewer, units] = await Promise.all([currentViewer(), readerUnits()]);
  const [{ default: Text }, work] = await Promise.all([load(), findLessonWork(id, viewer, units)]);
  const personId = viewer?.personId ?? null;
  const signInHref = `/sign-in?from=${encodeURIComponent(lessonPath(lesson))}`;
  return (
    <Page>
      <div className="grid grid-cols-[1.25rem_minmax(0,1fr)] gap-x-4 lg:grid-cols-[7.25rem_minmax(0,1fr)] lg:gap-x-7 print:block">
        <RuleMargin sections={lesson.sections} />
        <article className="[&_.katex-display]:pl-6 [&_.katex-display>.katex]:text-left!">
          <PageHeading eyebrow={`Unit ${lesson.unitNumber} · ${lesson.unitTitle}`}>
            {lesson.title}
          </PageHeading>
          <BenchLockProvider predicted={work.predicted}>
            <Text components={lessonNames(id, work, { personId, units, signInHref })} />
          </BenchLockProvider>
        </article>
      </div>
    </Page>
  );
}
