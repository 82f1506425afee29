'use client';

import clsx from 'clsx';
import { useId, useState } from 'react';
import { readTyped, type FieldView } from './reading';

interface NumberFieldProps {
  readonly label: string;
  readonly field: FieldView;
  readonly value: string;
  readonly onChange: (typed: string) => void;
  /** True once the answer was to be checked: then an empty or unreadable field says so. */
  readonly checked: boolean;
  /** True while this part's last marking was not right. */
  readonly wrong: boolean;
}

/**
 * Takes what a woodworker writes and says back how it reads. A refusal waits until the field is
 * left, so that nobody is told off in the middle of a number.
 */
export function NumberField({ label, field, value, onChange, checked, wrong }: NumberFieldProps) {
  const id = useId();
  const [left, setLeft] = useState(false);
  const reading = readTyped(value, field);
  const complaint =
    reading.state === 'refused' && (left || checked)
      ? reading.message
      : reading.state === 'empty' && checked
        ? `Still to be answered: ${field.expects}.`
        : null;
  return (
    <div className="w-full min-w-40 sm:w-auto sm:max-w-64">
      <label htmlFor={id} className="mb-1 block text-base font-semibold">
        {label}
      </label>
      <span className="flex items-center gap-2">
        <input
          id={id}
          type="text"
          inputMode="text"
          autoComplete="off"
          autoCapitalize="off"
          spellCheck={false}
          maxLength={60}
          value={value}
          onChange={(event) => {
            setLeft(false);
            onChange(event.target.value);
          }}
          onBlur={() => setLeft(true)}
          aria-invalid={complaint !== null || wrong ? true : undefined}
          aria-describedby={`${id}-echo`}
          className="min-h-11 w-full min-w-0 rounded border border-pencil bg-paper px-3 py-2 font-mono text-ink aria-invalid:border-2 aria-invalid:border-madder"
        />
        {field.unit === '' ? null : (
          <span aria-hidden="true" className="font-mono text-[0.9375rem] text-pencil">
            {field.unit}
          </span>
        )}
      </span>
      <p id={`${id}-echo`} className="mt-1 text-[0.9375rem]">
        {complaint === null ? (
          <span className={clsx('text-pencil', reading.state === 'read' && 'font-mono')}>
            {reading.state === 'read' ? reading.echo : sentence(field.expects)}
          </span>
        ) : (
          <span className="font-semibold text-madder">
            <span aria-hidden="true">✕ </span>
            {complaint}
          </span>
        )}
      </p>
    </div>
  );
}

function sentence(expects: string): string {
  return expects.charAt(0).toUpperCase() + expects.slice(1);
}
