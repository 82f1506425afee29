'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import { Bench } from '@/components/bench/bench';
import type { BenchSpec, SettingValues } from '@/lib/scene/bench-spec';
import type { PartView } from '@/lib/schemas/round';

export type SettingPart = Extract<PartView, { kind: 'setting' }>;

interface SettingFieldProps {
  readonly part: SettingPart;
  readonly figure: BenchSpec;
  readonly title: string;
  /** What was set before, in this tab; the bench starts there. */
  readonly setting: SettingValues;
  readonly onChange: (setting: SettingValues) => void;
  /** True when the answer was to be checked and the bench still stands as it was given. */
  readonly missing: boolean;
}

/** A bench whose own controls are the answer. */
export function SettingField({
  part,
  figure,
  title,
  setting,
  onChange,
  missing,
}: SettingFieldProps) {
  const [start] = useState(() => ({ ...figure, ...setting }) as BenchSpec);
  const tell = useChanges(onChange);
  return (
    <fieldset className="w-full min-w-0">
      <legend className="mb-2 text-base font-semibold">{part.label}</legend>
      <Criteria criteria={part.criteria} />
      <Bench spec={start} title={title} onSettingChange={tell} />
      {missing ? (
        <p className="mt-1 text-[0.9375rem] font-semibold text-madder">
          <span aria-hidden="true">✕ </span>
          The bench still stands as you found it. Set it first.
        </p>
      ) : null}
    </fieldset>
  );
}

/**
 * A bench says at once what it is set to, and again at every change. Only what differs from its
 * start is the learner's doing and is handed on.
 */
function useChanges(onChange: (setting: SettingValues) => void): (values: SettingValues) => void {
  const handOn = useRef(onChange);
  const last = useRef<string | null>(null);
  useEffect(() => {
    handOn.current = onChange;
  });
  return useCallback((values: SettingValues) => {
    const text = JSON.stringify(values);
    const before = last.current;
    last.current = text;
    if (before !== null && before !== text) handOn.current(values);
  }, []);
}

/** What will be looked at, each on its own. */
export function Criteria({ criteria }: { readonly criteria: readonly string[] }) {
  if (criteria.length === 0) return null;
  return (
    <div className="mb-3 text-base text-pencil">
      <p>Looked at one by one:</p>
      <ul className="list-disc pl-6">
        {criteria.map((criterion) => (
          <li key={criterion}>{criterion}</li>
        ))}
      </ul>
    </div>
  );
}
