import clsx from 'clsx';
import type { ComponentProps, ReactNode } from 'react';

interface Around {
  readonly label: ReactNode;
  readonly name: string;
  /** What is expected, said before anything goes wrong. */
  readonly hint?: ReactNode;
  /** What is wrong with what was typed, and what would be right. */
  readonly error?: string | undefined;
}

const control =
  'block min-h-11 w-full rounded border bg-paper px-3 py-2 text-base text-ink aria-invalid:border-2 aria-invalid:border-madder border-pencil';

function described(id: string, hint: unknown, error: unknown): string | undefined {
  const ids = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean);
  return ids.length > 0 ? ids.join(' ') : undefined;
}

function Surround({
  id,
  label,
  hint,
  error,
  children,
}: Omit<Around, 'name'> & { readonly id: string; readonly children: ReactNode }) {
  return (
    <div className="mb-5">
      <label htmlFor={id} className="mb-1 block text-base font-semibold">
        {label}
      </label>
      {children}
      {hint ? (
        <p id={`${id}-hint`} className="mt-1 text-[0.9375rem] text-pencil">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} className="mt-1 text-[0.9375rem] font-semibold text-madder">
          <span aria-hidden="true">✕ </span>
          {error}
        </p>
      ) : null}
    </div>
  );
}

type TextFieldProps = Around & Omit<ComponentProps<'input'>, 'name'>;

/** One line to type in, with its label, its hint and its error tied to it. */
export function TextField({ label, hint, error, id, className, ...rest }: TextFieldProps) {
  const key = id ?? rest.name;
  return (
    <Surround id={key} label={label} hint={hint} error={error}>
      <input
        id={key}
        className={clsx(control, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={described(key, hint, error)}
        {...rest}
      />
    </Surround>
  );
}

type TextAreaFieldProps = Around & Omit<ComponentProps<'textarea'>, 'name'>;

/** Several lines to type in, with their label, their hint and their error tied to them. */
export function TextAreaField({ label, hint, error, id, className, ...rest }: TextAreaFieldProps) {
  const key = id ?? rest.name;
  return (
    <Surround id={key} label={label} hint={hint} error={error}>
      <textarea
        id={key}
        className={clsx(control, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={described(key, hint, error)}
        {...rest}
      />
    </Surround>
  );
}

type SelectFieldProps = Around & Omit<ComponentProps<'select'>, 'name'>;

/** A choice of one from a list, with its label, its hint and its error tied to it. */
export function SelectField({ label, hint, error, id, className, ...rest }: SelectFieldProps) {
  const key = id ?? rest.name;
  return (
    <Surround id={key} label={label} hint={hint} error={error}>
      <select
        id={key}
        className={clsx(control, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={described(key, hint, error)}
        {...rest}
      />
    </Surround>
  );
}
