'use client';

import { useId } from 'react';
import { Button } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import type { ProgressChoice, ProgressView } from './progress-view';

interface ProgressControlsProps {
  readonly choice: ProgressChoice;
  readonly onChoose: (choice: ProgressChoice) => void;
  readonly view: ProgressView;
  /** Where the same is to be had as a file. */
  readonly csvHref: string;
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
export function ProgressControls({ choice, onChoose, view, csvHref }: ProgressControlsProps) {
  const id = useId();
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
      <div className="grid gap-x-5 sm:grid-cols-3">
        <TextField
          id={`${id}-name`}
          name="learner"
          label="Learner"
          type="search"
          autoComplete="off"
          value={choice.name}
          disabled={choice.hideNames}
          onChange={(event) => choose({ name: event.target.value })}
        />
        {oneOf('state', 'Show', states)}
        {oneOf('order', 'Order', orders)}
      </div>
      <div className="mb-4 flex flex-wrap items-center gap-3">
        <Button
          variant="quiet"
          aria-pressed={choice.hideNames}
          onClick={() => choose({ hideNames: !choice.hideNames, name: '' })}
        >
          {choice.hideNames ? 'Show names' : 'Hide names for the projector'}
        </Button>
        <Button variant="quiet" onClick={() => window.print()}>
          Print
        </Button>
        <a href={csvHref} download className="link link-target">
          Take it away as CSV
        </a>
        <Pages choice={choice} onChoose={onChoose} view={view} />
      </div>
      <p role="status" className="sr-only">
        {view.fitting} {view.fitting === 1 ? 'learner' : 'learners'} shown
      </p>
    </div>
  );
}

function Pages({ choice, onChoose, view }: Omit<ProgressControlsProps, 'csvHref'>) {
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
