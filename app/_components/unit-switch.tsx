'use client';

import { useTransition } from 'react';
import { useRouter } from 'next/navigation';
import clsx from 'clsx';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { setUnits } from '../actions';

const choices: readonly {
  readonly units: UnitSystem;
  readonly short: string;
  readonly full: string;
}[] = [
  { units: 'metric', short: 'mm', full: 'millimetres' },
  { units: 'inch', short: 'in', full: 'inches' },
];

/** Millimetres or inches, for everything that follows; each has its own open rounds. */
export function UnitSwitch({ units }: Readonly<{ units: UnitSystem }>) {
  const [pending, startTransition] = useTransition();
  const router = useRouter();
  const choose = (next: UnitSystem) => {
    if (pending || next === units) return;
    startTransition(async () => {
      await setUnits(next);
      router.refresh();
    });
  };
  return (
    <div role="group" aria-label="Units" className="flex font-mono text-[0.9375rem]">
      {choices.map((choice) => (
        <button
          key={choice.units}
          type="button"
          aria-pressed={choice.units === units}
          onClick={() => choose(choice.units)}
          className={clsx(
            'min-h-11 min-w-11 border-b-2 px-2',
            choice.units === units
              ? 'border-brass font-semibold text-ink'
              : 'border-transparent text-pencil hover:border-pencil',
          )}
        >
          {choice.short}
          <span className="sr-only"> ({choice.full})</span>
        </button>
      ))}
    </div>
  );
}
