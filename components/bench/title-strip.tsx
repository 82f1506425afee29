'use client';

import type { BenchStore } from './bench-store';
import { useShown } from './use-bench';

interface TitleStripProps {
  readonly store: BenchStore;
  readonly id: string;
  readonly title: string;
  /** mm of the page for one mm of the mechanism. */
  readonly scale: number;
  readonly locked: boolean;
}

/** The bench's name and readouts, set out like the title block of a working drawing. */
export function TitleStrip({ store, id, title, scale, locked }: TitleStripProps) {
  const { model, drive } = useShown(store);
  const readouts = locked ? [] : model.readouts(drive);
  const units = model.spec.units === 'inch' ? 'in' : 'mm';
  return (
    <div className="flex flex-col border-b border-ink @4xl:flex-row">
      <p id={id} className="flex-1 px-4 py-3 font-heading text-lg leading-tight font-semibold">
        {title}
      </p>
      <dl className="grid auto-cols-auto grid-cols-[repeat(auto-fit,minmax(8rem,1fr))] @4xl:flex">
        {readouts.map(({ key, label, value }) => (
          <Cell key={key} label={label} value={value} />
        ))}
        <Cell label="Scale" value={`${scaleText(scale)}, ${units}`} />
      </dl>
    </div>
  );
}

function Cell({ label, value }: { readonly label: string; readonly value: string }) {
  return (
    <div className="border-t border-l border-rule px-2.5 py-2 @4xl:min-w-32 @4xl:border-t-0">
      <dt className="text-[0.8125rem] leading-tight text-pencil">{label}</dt>
      <dd className="font-mono text-[0.875rem] leading-snug tabular-nums @4xl:text-[0.9375rem] @4xl:whitespace-nowrap">
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
