'use client';

import { fixedNumber } from '@/lib/scene/measure';
import type { BenchStore } from './bench-store';
import { NumberEntry } from './number-entry';
import { railButton } from './rail-button';
import { useShown } from './use-bench';

interface DriveRailProps {
  readonly store: BenchStore;
  readonly id: string;
}

/** The driver's controls: turn, step, slide, type. */
export function DriveRail({ store, id }: DriveRailProps) {
  const { model, drive, running, pace } = useShown(store);
  const control = model.drive;
  const raw = control.toShown(drive);
  const exact = control.round === null ? raw : wrapped(raw, control.least, control.round);
  const shown = Number(exact.toFixed(control.places + 2));
  const text = fixedNumber(shown, control.places);
  const moveTo = (value: number) => {
    store.run(false);
    store.moveTo(control.fromShown(value + raw - exact), 'drive');
  };
  const { pace: paces } = control;
  return (
    <div className="grid gap-x-4 gap-y-1 @2xl:grid-cols-[auto_1fr_auto] @2xl:items-center">
      <div className="flex gap-2">
        <button type="button" className={railButton('main')} onClick={() => store.run(!running)}>
          {running ? 'Pause' : control.verb}
        </button>
        <button type="button" className={railButton()} onClick={() => store.stepBy(-1)}>
          Step back
        </button>
        <button type="button" className={railButton()} onClick={() => store.stepBy(1)}>
          Step
        </button>
      </div>
      <label className="flex items-center gap-3">
        <span className="shrink-0 text-base font-semibold">{control.label}</span>
        <input
          type="range"
          className="bench-range"
          min={control.least}
          max={control.most}
          step={control.notch}
          value={Math.min(control.most, Math.max(control.least, shown))}
          aria-valuetext={`${text} ${control.unit}`}
          onChange={(event) => moveTo(Number(event.target.value))}
          onPointerUp={() => store.settle()}
        />
      </label>
      <NumberEntry
        id={`${id}-drive`}
        label={`${control.label}, ${control.unit}`}
        unit={control.unit}
        value={shown}
        text={text}
        spoken={`${text} ${control.unit}`}
        least={control.round === null ? -1e6 : control.least}
        most={control.round === null ? 1e6 : control.most}
        step={control.notch}
        field={control.field}
        onChange={moveTo}
      />
      <label className="flex items-center gap-3 @2xl:col-span-2">
        <span className="shrink-0 text-base">Pace</span>
        <input
          type="range"
          className="bench-range max-w-60"
          min={paces.least}
          max={paces.most}
          step={paces.step}
          value={pace}
          aria-valuetext={`${pace} ${paces.unit}`}
          onChange={(event) => store.pace(Number(event.target.value))}
        />
        <span className="font-mono text-[0.9375rem] whitespace-nowrap tabular-nums">
          {pace} {paces.unit}
        </span>
      </label>
    </div>
  );
}

/** The value brought into the range that begins at `least` by whole rounds. */
function wrapped(value: number, least: number, round: number): number {
  return value - Math.floor((value - least) / round) * round;
}
