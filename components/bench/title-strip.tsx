'use client';

import { useRef } from 'react';
import type { Readout } from '@/lib/scene/bench-model';
import type { BenchMoment, BenchStore } from './bench-store';
import { useChosen, useWriting } from './use-bench';

interface TitleStripProps {
  readonly store: BenchStore;
  readonly id: string;
  readonly title: string;
  /** mm of the page for one mm of the mechanism. */
  readonly scale: number;
  readonly locked: boolean;
}

/**
 * The bench's name and readouts, set out like the title block of a working drawing. React renders
 * it anew for another mechanism only; while one moves, its figures are written straight into place.
 */
export function TitleStrip({ store, id, title, scale, locked }: TitleStripProps) {
  const { units } = useChosen(store, (moment) => moment.model).spec;
  const readouts = locked ? [] : readoutsAt(store.shown());
  const list = useRef<HTMLDListElement>(null);
  useWriting(store, (moment) => {
    for (const { key, value } of locked ? [] : readoutsAt(moment)) {
      const figure = list.current?.querySelector(`[data-readout="${key}"]`)?.firstChild;
      if (figure && figure.nodeValue !== value) figure.nodeValue = value;
    }
  });
  return (
    <div className="flex flex-col border-b border-ink @4xl:flex-row">
      <p id={id} className="flex-1 px-4 py-3 font-heading text-lg leading-tight font-semibold">
        {title}
      </p>
      <dl
        ref={list}
        className="grid auto-cols-auto grid-cols-[repeat(auto-fit,minmax(7.5rem,1fr))] @4xl:flex"
      >
        {readouts.map(({ key, label, value }) => (
          <Cell key={key} name={key} label={label} value={value} />
        ))}
        <Cell label="Scale" value={`${scaleText(scale)}, ${units === 'inch' ? 'in' : 'mm'}`} />
      </dl>
    </div>
  );
}

function readoutsAt({ model, drive }: BenchMoment): readonly Readout[] {
  return model.readouts(drive);
}

interface CellProps {
  readonly label: string;
  readonly value: string;
  /** The readout's key, by which its figure is found again. */
  readonly name?: string;
}

function Cell({ label, value, name }: CellProps) {
  return (
    <div className="border-t border-l border-rule px-2.5 py-2 @4xl:min-w-32 @4xl:border-t-0">
      <dt className="text-[0.8125rem] leading-tight text-pencil">{label}</dt>
      <dd
        data-readout={name}
        className="font-mono text-[0.875rem] leading-snug tabular-nums @4xl:text-[0.9375rem] @4xl:whitespace-nowrap"
      >
        {value}
      </dd>
    </div>
  );
}

/** `1:2.5`, or `2:1` where the drawing is larger than life. */
function scaleText(scale: number): string {
  const brief = (value: number) => (value < 10 ? value.toFixed(1) : value.toFixed(0));
  return scale >= 1 ? `${brief(scale)}:1` : `1:${brief(1 / scale)}`;
}
