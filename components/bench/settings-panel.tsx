'use client';

import { useId } from 'react';
import type {
  ChoiceControl,
  NumberControl,
  SettingControl,
  TrayControl,
} from '@/lib/scene/bench-model';
import type { BenchStore } from './bench-store';
import { NumberEntry } from './number-entry';
import { PartsTray } from './parts-tray';
import { railButton } from './rail-button';
import { useChosen } from './use-bench';

/** More notches than this are easier to slide over than to count. */
const manyNotches = 50;

interface SettingsPanelProps {
  readonly store: BenchStore;
}

/** What the learner may change about the mechanism itself, a control each. */
export function SettingsPanel({ store }: SettingsPanelProps) {
  const model = useChosen(store, (moment) => moment.model);
  if (model.controls.length === 0) return null;
  const set = (key: string, value: number | string) =>
    store.setting(model.set(key, value), `set ${key}`);
  return (
    <details open className="border-t border-ink px-4 pb-1 print:hidden">
      <summary className="inline-flex min-h-11 items-center text-base font-semibold">
        Set the mechanism
      </summary>
      <div className="grid items-start gap-x-6 gap-y-3 pb-3 @xl:grid-cols-2 @4xl:grid-cols-3">
        {model.controls.map((control) =>
          control.kind === 'tray' ? (
            <PartsTray key="tray" store={store} control={control} />
          ) : (
            <Setting key={control.key} control={control} onSet={set} />
          ),
        )}
      </div>
    </details>
  );
}

interface SettingProps<C = Exclude<SettingControl, TrayControl>> {
  readonly control: C;
  readonly onSet: (key: string, value: number | string) => void;
}

function Setting({ control, onSet }: SettingProps) {
  switch (control.kind) {
    case 'number':
      return <NumberSetting control={control} onSet={onSet} />;
    case 'choice':
      return <ChoiceSetting control={control} onSet={onSet} />;
    case 'action':
      return (
        <button
          type="button"
          className={`${railButton()} self-end`}
          onClick={() => onSet(control.key, '')}
        >
          {control.label}
        </button>
      );
  }
}

function NumberSetting({ control, onSet }: SettingProps<NumberControl>) {
  const id = useId();
  const { key, label, unit, value, text, spoken, least, most, step, field } = control;
  return (
    <div>
      <label htmlFor={id} className="block text-[0.9375rem] font-semibold">
        {label}
      </label>
      <NumberEntry
        {...{ id, label, unit, value, text, spoken, least, most, step, field }}
        onChange={(next) => onSet(key, next)}
      />
      {(most - least) / step > manyNotches && control.slides ? (
        <input
          type="range"
          className="bench-range"
          aria-label={`${label}, slider`}
          aria-valuetext={spoken}
          min={least}
          max={most}
          step={step}
          value={value}
          onChange={(event) => onSet(key, Number(event.target.value))}
        />
      ) : null}
    </div>
  );
}

function ChoiceSetting({ control, onSet }: SettingProps<ChoiceControl>) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="block text-[0.9375rem] font-semibold">
        {control.label}
      </label>
      <select
        id={id}
        className="min-h-11 w-full rounded border border-pencil bg-paper px-2 text-base"
        value={control.value}
        onChange={(event) => onSet(control.key, event.target.value)}
      >
        {control.options.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
    </div>
  );
}
