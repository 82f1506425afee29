'use client';

import clsx from 'clsx';
import { useId, useState } from 'react';
import { Button, buttonClass } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import type { ProgressChoice, ProgressView } from './progress-view';

interface ProgressControlsProps {
  readonly choice: ProgressChoice;
  readonly onChoose: (choice: ProgressChoice) => void;
  readonly view: ProgressView;
  readonly classId: string;
  /** Hidden for the projector: then nothing of the page tells who is who. */
  readonly names: 'shown' | 'hidden';
  readonly lessonId: string | null;
}

const states = {
  all: 'everybody',
  'not begun': 'not begun',
  'something left': 'something left',
  late: 'something late',
  done: 'all right',
} as const;

const orders = {
  name: 'by name',
  'least done': 'least done first',
  'most done': 'most done first',
} as const;

/** Whom the table shows, in which order; without names for the projector; as a file; on paper. */
export function ProgressControls(props: ProgressControlsProps) {
  const { choice, onChoose, view, names } = props;
  const id = useId();
  const [open, setOpen] = useState(false);
  const choose = (changes: Partial<ProgressChoice>) => onChoose({ ...choice, page: 0, ...changes });
  const oneOf = <Name extends 'state' | 'order'>(
    name: Name,
    label: string,
    words: Readonly<Record<ProgressChoice[Name], string>>,
  ) => (
    <SelectField
      id={`${id}-${name}`}
      name={name}
      label={label}
      value={choice[name]}
      onChange={(event) => choose({ [name]: event.target.value })}
    >
      {Object.entries<string>(words).map(([value, word]) => (
        <option key={value} value={value}>
          {word}
        </option>
      ))}
    </SelectField>
  );
  return (
    <div className="print:hidden">
      <Button
        variant="quiet"
        className="mb-3 sm:hidden"
        aria-expanded={open}
        aria-controls={`${id}-filters`}
        onClick={() => setOpen(!open)}
      >
        {open ? 'Less to choose' : `Choose: ${states[choice.state]}, ${orders[choice.order]}`}
      </Button>
      <div
        id={`${id}-filters`}
        className={clsx('gap-x-5 sm:grid sm:grid-cols-3', open ? 'grid' : 'hidden')}
      >
        {names === 'shown' ? (
          <TextField
            id={`${id}-name`}
            name="learner"
            label="Learner"
            type="search"
            autoComplete="off"
            value={choice.name}
            onChange={(event) => choose({ name: event.target.value })}
          />
        ) : null}
        {oneOf('state', 'Show', states)}
        {oneOf('order', 'Order', orders)}
      </div>
      <div className="mb-4 flex flex-wrap items-center gap-3">
        <WaysOut {...props} />
        <Pages choice={choice} onChoose={onChoose} view={view} />
      </div>
      <p role="status" className="sr-only">
        {view.fitting} {view.fitting === 1 ? 'learner' : 'learners'} shown
      </p>
    </div>
  );
}

/** Plain links, so that nothing with names is left in a page that hides them. */
function WaysOut({ classId, names, lessonId }: ProgressControlsProps) {
  const wanted = new URLSearchParams({
    ...(lessonId === null ? {} : { lesson: lessonId }),
    ...(names === 'shown' ? { names: 'hidden' } : {}),
  });
  return (
    <>
      <a href={`/classes/${classId}?${wanted}`} className={buttonClass('quiet')}>
        {names === 'hidden' ? 'Show names' : 'Hide names for the projector'}
      </a>
      <Button variant="quiet" onClick={() => window.print()}>
        Print
      </Button>
      {names === 'shown' ? (
        <a href={`/api/classes/${classId}/progress/csv`} download className="link link-target">
          Take it away as CSV
        </a>
      ) : null}
    </>
  );
}

function Pages({
  choice,
  onChoose,
  view,
}: Pick<ProgressControlsProps, 'choice' | 'onChoose' | 'view'>) {
  if (view.pages === 1) return null;
  const turn = (page: number) => onChoose({ ...choice, page });
  return (
    <span className="flex items-center gap-3">
      <Button variant="quiet" disabled={view.page === 0} onClick={() => turn(view.page - 1)}>
        Before
      </Button>
      <span className="text-pencil">
        page {view.page + 1} of {view.pages}
      </span>
      <Button
        variant="quiet"
        disabled={view.page + 1 === view.pages}
        onClick={() => turn(view.page + 1)}
      >
        Next
      </Button>
    </span>
  );
}
