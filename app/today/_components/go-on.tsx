import { PegRail } from '@/components/progress/peg-rail';
import { ButtonLink } from '@/components/ui/button';
import { Panel } from '@/components/ui/panel';
import type { Today } from '@/lib/data/today';

/** Where the learner was last, with one button that leads there; at first, where to begin. */
export function GoOn({ today }: Readonly<{ today: Today }>) {
  const { last, lessons, set } = today;
  const firstSet = set.find((work) => work.done < work.exercises.length)?.exercises[0]?.lesson;
  const place = last?.lesson ?? firstSet ?? lessons[0];
  if (!place) return null;
  const pegs = lessons.find((lesson) => lesson.lessonId === place.lessonId)?.pegs ?? [];
  return (
    <Panel>
      <p className="text-pencil">{last ? last.title : 'The first lesson'}</p>
      <p className="mb-2 font-heading text-xl font-semibold">{place.title}</p>
      <p className="mb-4">
        <PegRail pegs={pegs} words />
      </p>
      <ButtonLink href={last ? `${place.path}#${last.exerciseId}` : place.path}>
        {last ? 'Go on' : 'Open the lesson'}
      </ButtonLink>
    </Panel>
  );
}
