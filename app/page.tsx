import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { TickedRule } from '@/components/ui/page-heading';
import { lessonPath, listLessons } from '@/content/lessons/front-matter';
import { LandingSteps } from './_components/landing-steps';
import { LessonCard } from './lessons/_components/lesson-card';

export default function LandingPage() {
  const lessons = listLessons();
  const first = lessons[0];
  return (
    <Page>
      <div className="grid items-start gap-10">
        <div>
          <h1 className="mb-4 text-[clamp(2.5rem,1.5rem+4.5vw,3.75rem)] leading-[1.08]">
            See it turn.
            <br />
            Then cut it.
          </h1>
          <TickedRule />
          <p className="mt-7 mb-6 max-w-measure text-xl text-pencil">
            Hornbeam teaches woodworkers the mechanisms behind moving things: toothed wheels, ovals,
            copies drawn larger. Turn them by hand, work out the sizes, be told where an answer went
            wrong, and go to the bench with a drawing that runs.
          </p>
          <div className="flex flex-wrap gap-3">
            {first ? <ButtonLink href={lessonPath(first)}>Open the first lesson</ButtonLink> : null}
            <ButtonLink href="/sign-in" variant="secondary">
              Sign in
            </ButtonLink>
          </div>
        </div>
      </div>
      <LandingSteps />
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
