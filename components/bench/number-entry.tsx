'use client';

import { useState, type KeyboardEvent } from 'react';
import type { Field } from '@/lib/quantities/field';
import { readQuantity } from '@/lib/quantities/read';

interface NumberEntryProps {
  readonly id: string;
  readonly label: string;
  readonly unit: string;
  readonly value: number;
  /** Where the value stands at this moment, if it moves by itself. */
  readonly valueNow?: () => number;
  readonly text: string;
  readonly spoken: string;
  readonly least: number;
  readonly most: number;
  readonly step: number;
  readonly field: Field;
  readonly onChange: (value: number) => void;
}

const square =
  'min-h-11 min-w-11 rounded border border-pencil bg-paper px-2 text-lg leading-none font-semibold hover:bg-board disabled:border-rule disabled:text-pencil';

/** A number to be typed as a woodworker writes it, stepped by arrow keys, or pressed up and down. */
export function NumberEntry(props: NumberEntryProps) {
  const { id, label, unit, value, text, spoken, least, most, step, field, onChange } = props;
  const { valueNow = () => value } = props;
  const [typed, setTyped] = useState<string | null>(null);
  const reading = typed === null ? null : readQuantity(typed, field);
  const refused = reading !== null && !reading.ok ? reading.message : null;
  const take = (next: number) => onChange(Math.min(most, Math.max(least, next)));
  const commit = () => {
    if (reading?.ok) take(reading.value);
    if (refused === null || typed?.trim() === '') setTyped(null);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter') {
      // Setting a bench is not sending an answer: the form around it stays where it is.
      event.preventDefault();
      commit();
    }
    if (event.key === 'Escape') setTyped(null);
    const next = steppedBy(event.key, valueNow(), step, least, most);
    if (next === null) return;
    event.preventDefault();
    setTyped(null);
    take(next);
  };
  return (
    <div className="flex flex-wrap items-center gap-1">
      <button
        type="button"
        className={square}
        aria-label={`${label}: less`}
        disabled={value <= least}
        onClick={() => take(valueNow() - step)}
      >
        −
      </button>
      <input
        id={id}
        role="spinbutton"
        aria-label={label}
        inputMode="text"
        autoComplete="off"
        className="min-h-11 w-20 rounded border border-pencil bg-paper px-2 text-center font-mono text-base aria-invalid:border-2 aria-invalid:border-madder @xs:w-24"
        aria-valuenow={value}
        aria-valuemin={least}
        aria-valuemax={most}
        aria-valuetext={spoken}
        aria-invalid={refused ? true : undefined}
        aria-describedby={refused ? `${id}-refused` : undefined}
        data-typed={typed === null ? undefined : true}
        value={typed ?? text}
        onChange={(event) => setTyped(event.target.value)}
        onBlur={commit}
        onKeyDown={onKeyDown}
      />
      <button
        type="button"
        className={square}
        aria-label={`${label}: more`}
        disabled={value >= most}
        onClick={() => take(valueNow() + step)}
      >
        +
      </button>
      <span className="text-[0.9375rem] text-pencil">{unit}</span>
      {refused ? (
        <p id={`${id}-refused`} className="basis-full text-[0.9375rem] text-madder" role="alert">
          {refused}
        </p>
      ) : null}
    </div>
  );
}

/** Where a key of a spin button leads, or null for any other key. */
function steppedBy(
  key: string,
  value: number,
  step: number,
  least: number,
  most: number,
): number | null {
  const steps: Readonly<Record<string, number>> = {
    ArrowUp: 1,
    ArrowDown: -1,
    PageUp: 10,
    PageDown: -10,
  };
  if (key === 'Home' || key === 'End') return null;
  const by = steps[key];
  return by === undefined ? null : Math.min(most, Math.max(least, value + by * step));
}
