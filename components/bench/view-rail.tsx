'use client';

import { useId } from 'react';
import type { BenchStore } from './bench-store';
import { railButton } from './rail-button';
import { useChosen } from './use-bench';
import { mostZoom, type Zoom } from './view';

interface ViewRailProps {
  readonly store: BenchStore;
  readonly zoom: Zoom;
  readonly onZoom: (factor: number) => void;
  readonly onPan: (shareX: number, shareY: number) => void;
  readonly onFit: () => void;
}

const ways = [
  ['←', 'Show more on the left', -0.25, 0],
  ['→', 'Show more on the right', 0.25, 0],
  ['↑', 'Show more above', 0, 0.25],
  ['↓', 'Show more below', 0, -0.25],
] as const;

/** What is shown and how near: tracing, dimensions, undo, zoom. */
export function ViewRail({ store, zoom, onZoom, onPan, onFit }: ViewRailProps) {
  const canUndo = useChosen(store, (moment) => moment.canUndo);
  const showing = useChosen(store, (moment) => moment.showing);
  return (
    <div className="flex flex-wrap items-center gap-2">
      <Check
        label="Tracing"
        checked={showing.tracing}
        onChange={(tracing) => store.show({ tracing })}
      />
      <Check
        label="Dimensions"
        checked={showing.dimensions}
        onChange={(dimensions) => store.show({ dimensions })}
      />
      <button type="button" className={railButton()} onClick={() => store.backToStart()}>
        Back to the start
      </button>
      <button
        type="button"
        className={railButton()}
        disabled={!canUndo}
        onClick={() => store.undo()}
      >
        Undo
      </button>
      <div className="flex gap-1">
        <button
          type="button"
          className={railButton('square')}
          aria-label="Zoom out"
          disabled={zoom.factor <= 1}
          onClick={() => onZoom(1 / 1.5)}
        >
          −
        </button>
        <button
          type="button"
          className={railButton('square')}
          aria-label="Zoom in"
          disabled={zoom.factor >= mostZoom}
          onClick={() => onZoom(1.5)}
        >
          +
        </button>
        <button type="button" className={railButton()} onClick={onFit}>
          Fit
        </button>
      </div>
      {zoom.factor > 1 ? (
        <div className="flex gap-1">
          {ways.map(([sign, name, x, y]) => (
            <button
              key={name}
              type="button"
              className={railButton('square')}
              aria-label={name}
              onClick={() => onPan(x, y)}
            >
              {sign}
            </button>
          ))}
        </div>
      ) : null}
    </div>
  );
}

interface CheckProps {
  readonly label: string;
  readonly checked: boolean;
  readonly onChange: (checked: boolean) => void;
}

function Check({ label, checked, onChange }: CheckProps) {
  const id = useId();
  return (
    <label htmlFor={id} className="inline-flex min-h-11 items-center gap-2 pr-2">
      <input
        id={id}
        type="checkbox"
        className="bench-check"
        checked={checked}
        onChange={(event) => onChange(event.target.checked)}
      />
      {label}
    </label>
  );
}
