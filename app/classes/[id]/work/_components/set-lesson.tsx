import { ActionForm } from '@/components/ui/action-form';
import { listLessons } from '@/content/lessons/front-matter';
import { dateIn, now } from '@/lib/clock';
import { setLesson } from '../actions';

interface SetLessonProps {
  readonly classId: string;
  readonly timeZone: string;
}

const WEEK = 7 * 24 * 60 * 60 * 1000;

/** Sets a lesson to the class: which, until when, and a word about it. */
export function SetLesson({ classId, timeZone }: SetLessonProps) {
  const nextWeek = new Date(now().getTime() + WEEK);
  return (
    <ActionForm
      action={setLesson.bind(null, classId)}
      submit="Set it"
      fields={[
        {
          name: 'lessonId',
          label: 'Lesson',
          options: listLessons().map(({ id, title }) => ({ value: id, label: title })),
        },
        { name: 'dueOn', label: 'Due on', type: 'date', value: dateIn(timeZone, nextWeek) },
        {
          name: 'dueTime',
          label: 'At',
          type: 'time',
          value: '18:30',
          hint: `By the clock of the class (${timeZone}).`,
        },
        { name: 'note', label: 'A word to go with it', hint: 'May be left empty.' },
      ]}
    />
  );
}
