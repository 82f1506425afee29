import type { ReactNode } from 'react';

/** One thing to be chosen. */
export interface Choice {
  readonly value: string;
  readonly label: ReactNode;
  readonly hint?: ReactNode;
}

interface ChoicesProps {
  readonly name: string;
  readonly choices: readonly Choice[];
  /** What is chosen before anything was pressed. */
  readonly chosen: readonly string[];
  /** One of them, or any number. */
  readonly kind: 'one' | 'several';
}

/** Things to be chosen, one or several, each with a label that is large enough for a thumb. */
export function Choices({ name, choices, chosen, kind }: ChoicesProps) {
  return (
    <ul>
      {choices.map(({ value, label, hint }) => (
        <li key={value}>
          {/* The key makes the browser take the kept choice up again after React has reset the form. */}
          <label
            key={String(chosen.includes(value))}
            className="flex min-h-11 items-start gap-3 py-2 text-base"
          >
            <input
              type={kind === 'one' ? 'radio' : 'checkbox'}
              name={name}
              value={value}
              defaultChecked={chosen.includes(value)}
              className="mt-1 size-5 shrink-0 accent-chalk"
            />
            <span>
              {label}
              {hint ? <span className="block text-[0.9375rem] text-pencil">{hint}</span> : null}
            </span>
          </label>
        </li>
      ))}
    </ul>
  );
}

interface FieldGroupProps {
  readonly legend: string;
  /** What is wrong with what was chosen, and what would be right. */
  readonly error?: string | undefined;
  readonly children: ReactNode;
}

/** Fields that belong together, under a heading of their own. */
export function FieldGroup({ legend, error, children }: FieldGroupProps) {
  return (
    <fieldset className="mb-7 min-w-0" aria-invalid={error ? true : undefined} tabIndex={-1}>
      <legend className="mb-2 w-full border-b border-rule pb-1 font-heading text-xl font-semibold">
        {legend}
      </legend>
      {error ? (
        <p className="mb-2 font-semibold text-madder">
          <span aria-hidden="true">✕ </span>
          {error}
        </p>
      ) : null}
      {children}
    </fieldset>
  );
}
