import type { Metadata } from 'next';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { listLessons } from '@/content/lessons/front-matter';
import { listMotions, motionsToCome } from './_components/entries';
import { MotionCard } from './_components/motion-card';

export const metadata: Metadata = { title: 'By motion' };

export default function ByMotionPage() {
  const lessons = listLessons();
  const toCome = motionsToCome(lessons);
  return (
    <Page>
      <PageHeading>By motion</PageHeading>
      <p className="mb-8 max-w-measure text-pencil">
        You know the motion you want, and not yet what makes it. Look for it here, turn the drawing,
        read where it ends, and go on to the lesson.
      </p>
      {listMotions(lessons).map(({ way, title, entries }) => (
        <Section key={way} title={title}>
          {entries.map((entry) => (
            <MotionCard key={entry.lesson.id} way={way} entry={entry} />
          ))}
        </Section>
      ))}
      {toCome.length > 0 ? (
        <Section title="Not here yet">
          <p className="max-w-measure text-pencil">
            Lessons for these are being written: {toCome.join(' · ')}.
          </p>
        </Section>
      ) : null}
    </Page>
  );
}
