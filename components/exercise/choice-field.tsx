'use client';

import clsx from 'clsx';
import { useId } from 'react';
import { Bench } from '@/components/bench/bench';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import type { PartView } from '@/lib/schemas/round';

export type ChoicePart = Extract<PartView, { kind: 'choice' }>;

interface ChoiceFieldProps {
  readonly part: ChoicePart;
  readonly chosen: readonly string[];
  readonly onChange: (chosen: readonly string[]) => void;
  readonly checked: boolean;
  /** True once the choice stands and is only shown. */
  readonly disabled?: boolean;
}

/** An option that says more as a mechanism than in words, to be driven. */
export function OptionBench({ option }: { readonly option: ChoicePart['options'][number] }) {
  if (option.figure === undefined) return null;
  return <Bench spec={option.figure as BenchSpec} title={option.label} />;
}

/** One or several of some options, each in words or as a live bench. */
export function ChoiceField({
  part,
  chosen,
  onChange,
  checked,
  disabled = false,
}: ChoiceFieldProps) {
  const id = useId();
  const missing = checked && chosen.length === 0;
  const drawn = part.options.some((option) => option.figure !== undefined);
  const choose = (option: string) => {
    if (!part.multiple) return onChange([option]);
    const without = chosen.filter((one) => one !== option);
    onChange(without.length === chosen.length ? [...chosen, option] : without);
  };
  return (
    <fieldset
      disabled={disabled}
      className="w-full min-w-0"
      aria-describedby={missing ? `${id}-missing` : undefined}
    >
      <legend className="mb-2 text-base font-semibold">{part.label}</legend>
      <div className={clsx('grid gap-2', drawn && 'gap-5 lg:grid-cols-2')}>
        {part.options.map((option) => (
          <div key={option.id} className={drawn ? 'min-w-0' : undefined}>
            <label
              className={clsx(
                'flex min-h-11 items-center gap-3 rounded border px-3 py-2',
                chosen.includes(option.id) ? 'border-2 border-chalk bg-board' : 'border-pencil',
              )}
            >
              <input
                type={part.multiple ? 'checkbox' : 'radio'}
                name={`${id}-${part.key}`}
                checked={chosen.includes(option.id)}
                onChange={() => choose(option.id)}
                className="size-5 shrink-0 accent-chalk"
              />
              <span>{option.label}</span>
            </label>
            <OptionBench option={option} />
          </div>
        ))}
      </div>
      {missing ? (
        <p id={`${id}-missing`} className="mt-1 text-[0.9375rem] font-semibold text-madder">
          <span aria-hidden="true">✕ </span>
          {part.multiple ? 'Choose at least one.' : 'Choose one of them.'}
        </p>
      ) : null}
    </fieldset>
  );
}
