import type { Metadata } from 'next';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { listLessons } from '@/content/lessons/front-matter';
import { currentViewer } from '@/lib/auth/viewer';
import { listPegs } from '@/lib/data/progress';
import { LessonCard } from './_components/lesson-card';
import { groupByUnit, unitsToCome } from './_components/units';

export const metadata: Metadata = { title: 'Lessons' };

export default async function LessonsPage() {
  const lessons = listLessons();
  const viewer = await currentViewer();
  const pegs = viewer ? await listPegs(viewer) : [];
  return (
    <Page>
      <PageHeading>Lessons</PageHeading>
      <p className="mb-8 max-w-measure text-pencil">
        Each lesson has a mechanism to turn, a rule to find, exercises with numbers of your own, and
        the way from the drawing to the wood. Reading and turning need no account; answering does.
      </p>
      {groupByUnit(lessons).map((unit) => (
        <Section key={unit.number} title={`${unit.number}. ${unit.title}`}>
          <ul className="border-t border-ink">
            {unit.lessons.map((lesson) => (
              <LessonCard
                key={lesson.id}
                lesson={lesson}
                pegs={pegs.filter((peg) => lesson.skills.includes(peg.skill))}
              />
            ))}
          </ul>
        </Section>
      ))}
      <Section title="Still on the drawing board">
        <p className="max-w-measure text-pencil">
          These units are being written: {unitsToCome(lessons).join(' · ')}.
        </p>
      </Section>
    </Page>
  );
}
