import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { lessonPath, listLessons } from '@/content/lessons/front-matter';
import { readerUnits } from '@/lib/auth/reader-units';
import { currentViewer } from '@/lib/auth/viewer';
import { LandingAnswer } from './_components/landing-answer';
import { LandingHero } from './_components/landing-hero';
import { LandingPegs } from './_components/landing-pegs';
import { LessonCard } from './lessons/_components/lesson-card';

export default async function LandingPage() {
  const [viewer, units] = await Promise.all([currentViewer(), readerUnits()]);
  const lessons = listLessons();
  const first = lessons[0];
  return (
    <Page>
      <LandingHero
        firstLesson={first ? lessonPath(first) : '/lessons'}
        signedIn={viewer !== null}
        units={units}
      />
      <LandingAnswer />
      <LandingPegs />
      <section className="mt-20">
        <h2 className="mb-3">The first lessons</h2>
        <ul className="border-t border-ink">
          {lessons.map((lesson) => (
            <LessonCard key={lesson.id} lesson={lesson} />
          ))}
        </ul>
      </section>
      <section className="mt-16 rounded border border-ink bg-board px-6 py-7">
        <h2 className="mb-2">Do you teach a class?</h2>
        <p className="mb-5 max-w-measure">
          Set a lesson for next week, see who has done it before they arrive, and open any answer
          down to the slip behind it.
        </p>
        <ButtonLink href="/for-instructors" variant="secondary">
          What Hornbeam does for instructors
        </ButtonLink>
      </section>
    </Page>
  );
}
