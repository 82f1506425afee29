'use client';

import { useState } from 'react';
import type { BenchTable } from '@/lib/scene/bench-model';
import { BenchPlot } from './bench-plot';
import type { BenchMoment, BenchStore } from './bench-store';
import { useChosen, useSettled } from './use-bench';

interface BenchWordsProps {
  readonly store: BenchStore;
  readonly id: string;
  readonly printing: boolean;
}

/** The bench in words, said again when it has come to rest, and its numbers. */
export function BenchWords({ store, id, printing }: BenchWordsProps) {
  const settled = useSettled(store);
  const { model, drive } = settled;
  const limits = model.limits(drive);
  return (
    <div className="border-t border-rule px-4 py-3">
      <div id={id} aria-live="polite" aria-atomic="true" className="max-w-measure">
        {limits.map((limit) => (
          <p key={limit} className="mb-1 font-semibold text-madder">
            <span aria-hidden="true">✕ </span>
            {limit}
          </p>
        ))}
        {model.remarks.map((remark) => (
          <p key={remark} className="mb-1 font-semibold">
            {remark}
          </p>
        ))}
        <p className="text-base">{model.describe(drive)}</p>
      </div>
      <Numbers store={store} settled={settled} printing={printing} />
    </div>
  );
}

interface NumbersProps extends Pick<BenchWordsProps, 'store' | 'printing'> {
  readonly settled: BenchMoment;
}

/** Plot and tables; they follow the drive only while somebody can see them. */
function Numbers({ store, settled, printing }: NumbersProps) {
  const [open, setOpen] = useState(false);
  const live = useChosen(store, (moment) => (open || printing ? moment : null));
  const { model, drive, pace } = live ?? settled;
  const { plot } = model;
  return (
    <details
      className="mt-2"
      open={open || printing}
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary className="inline-flex min-h-11 items-center text-base font-semibold text-chalk">
        {plot ? 'Plot and numbers' : 'Numbers'}
      </summary>
      <div className="grid gap-5 @3xl:grid-cols-2">
        {plot ? <BenchPlot plot={plot} drive={drive} /> : null}
        <div className="min-w-0">
          {model.tables(drive, pace).map((table) => (
            <NumbersTable key={table.caption} table={table} />
          ))}
        </div>
      </div>
    </details>
  );
}

function NumbersTable({ table }: { readonly table: BenchTable }) {
  return (
    <div className="mb-4 overflow-x-auto">
      <table className="w-full border-collapse text-left text-[0.9375rem]">
        <caption className="pb-1 text-left font-semibold">{table.caption}</caption>
        <thead className="border-b border-ink bg-board">
          <tr>
            {table.head.map((name) => (
              <th key={name} scope="col" className="px-2 py-1.5 font-semibold">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map((row, index) => (
            <tr key={index} className="border-b border-rule">
              <th scope="row" className="px-2 py-1 font-normal">
                {row[0]}
              </th>
              {row.slice(1).map((cell, column) => (
                <td
                  key={table.head[column + 1]}
                  className="px-2 py-1 font-mono whitespace-nowrap tabular-nums"
                >
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
