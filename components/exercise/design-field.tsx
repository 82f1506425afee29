'use client';

import { useId } from 'react';
import type { PartView } from '@/lib/schemas/round';
import { NumberField } from './number-field';
import { Criteria } from './setting-field';

export type DesignPart = Extract<PartView, { kind: 'design' }>;
export type DesignAnswer = Readonly<Record<string, number | string>>;

interface DesignFieldProps {
  readonly part: DesignPart;
  readonly answer: DesignAnswer;
  readonly onChange: (answer: DesignAnswer) => void;
  readonly checked: boolean;
}

/** A specification to be met with free choices: from the stock, or written in. */
export function DesignField({ part, answer, onChange, checked }: DesignFieldProps) {
  const id = useId();
  const set = (key: string, value: number | string) => onChange({ ...answer, [key]: value });
  return (
    <fieldset className="w-full">
      <legend className="mb-2 text-base font-semibold">{part.label}</legend>
      <Criteria criteria={part.criteria} />
      <div className="flex flex-wrap gap-4">
        {part.fields.map((field) =>
          field.kind === 'quantity' ? (
            <NumberField
              key={field.key}
              label={field.label}
              field={field}
              value={String(answer[field.key] ?? '')}
              onChange={(typed) => set(field.key, typed)}
              checked={checked}
              wrong={false}
            />
          ) : (
            <div key={field.key} className="w-full min-w-40 sm:w-auto">
              <label htmlFor={`${id}-${field.key}`} className="mb-1 block text-base font-semibold">
                {field.label}
              </label>
              <select
                id={`${id}-${field.key}`}
                value={String(answer[field.key] ?? '')}
                onChange={(event) => set(field.key, Number(event.target.value))}
                aria-invalid={checked && answer[field.key] === undefined ? true : undefined}
                className="min-h-11 w-full rounded border border-pencil bg-paper px-3 py-2 font-mono aria-invalid:border-2 aria-invalid:border-madder"
              >
                <option value="" disabled>
                  Choose one
                </option>
                {field.choices.map((choice) => (
                  <option key={choice.value} value={choice.value}>
                    {choice.label}
                  </option>
                ))}
              </select>
            </div>
          ),
        )}
      </div>
    </fieldset>
  );
}
