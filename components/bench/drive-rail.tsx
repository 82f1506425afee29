'use client';

import { useRef } from 'react';
import { fixedNumber } from '@/lib/scene/measure';
import type { BenchMoment, BenchStore } from './bench-store';
import { NumberEntry } from './number-entry';
import { railButton } from './rail-button';
import { useChosen, useWriting } from './use-bench';

interface DriveRailProps {
  readonly store: BenchStore;
  readonly id: string;
}

/**
 * The driver's controls: turn, step, slide, type. While it runs by itself, slider and field follow it
 * without React.
 */
export function DriveRail({ store, id }: DriveRailProps) {
  const running = useChosen(store, (moment) => moment.running);
  const pace = useChosen(store, (moment) => moment.pace);
  const control = useChosen(store, (moment) => moment.model).drive;
  // At rest React hears of the drive too, so that its own idea of the fields is never stale.
  useChosen(store, (moment) => (moment.running ? null : moment.drive));
  const { shown, text, spoken } = reading(store.shown());
  const rail = useRef<HTMLDivElement>(null);
  useWriting(store, (moment) => follow(rail.current, reading(moment)));
  const moveTo = (value: number) => {
    const { whole } = reading(store.moment());
    store.run(false);
    store.moveTo(control.fromShown(value + whole), 'drive');
  };
  const { pace: paces } = control;
  return (
    <div
      ref={rail}
      className="grid grid-cols-[minmax(0,1fr)] gap-x-4 gap-y-1 @4xl:grid-cols-[auto_1fr_auto] @4xl:items-center"
    >
      <div className="flex flex-wrap gap-2">
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
          className="bench-range min-w-0"
          min={control.least}
          max={control.most}
          step={control.notch}
          data-drive
          value={Math.min(control.most, Math.max(control.least, shown))}
          aria-valuetext={spoken}
          onChange={(event) => moveTo(Number(event.target.value))}
          onPointerUp={() => store.settle()}
        />
      </label>
      <NumberEntry
        id={`${id}-drive`}
        label={`${control.label}, ${control.unit}`}
        unit={control.unit}
        value={shown}
        valueNow={() => reading(store.moment()).shown}
        text={text}
        spoken={spoken}
        least={control.round === null ? -1e6 : control.least}
        most={control.round === null ? 1e6 : control.most}
        step={control.notch}
        field={control.field}
        onChange={moveTo}
      />
      <label className="flex items-center gap-3 @4xl:col-span-2">
        <span className="shrink-0 text-base">Pace</span>
        <input
          type="range"
          className="bench-range max-w-60 min-w-0"
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

/** The drive as it is read: within its round, and the whole rounds that were left out. */
function reading({ model, drive }: BenchMoment) {
  const { toShown, round, least, places, unit } = model.drive;
  const raw = toShown(drive);
  const whole = round === null ? 0 : Math.floor((raw - least) / round) * round;
  const shown = Number((raw - whole).toFixed(places + 2));
  const text = fixedNumber(shown, places);
  return { shown, whole, text, spoken: `${text} ${unit}` };
}

/** Brings slider and field to where the drive stands; what somebody is typing is left alone. */
function follow(
  rail: HTMLElement | null,
  { shown, text, spoken }: ReturnType<typeof reading>,
): void {
  const slider = rail?.querySelector<HTMLInputElement>('[data-drive]');
  const field = rail?.querySelector<HTMLInputElement>('[role=spinbutton]');
  if (slider) {
    slider.value = String(shown);
    slider.setAttribute('aria-valuetext', spoken);
  }
  if (field && field.dataset.typed === undefined) {
    if (field.value !== text) field.value = text;
    field.setAttribute('aria-valuenow', String(shown));
    field.setAttribute('aria-valuetext', spoken);
  }
}
