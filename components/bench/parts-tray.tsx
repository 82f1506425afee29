'use client';

import { useState, type KeyboardEvent, type PointerEvent } from 'react';
import type { TrayControl, TrayPart } from '@/lib/scene/bench-model';
import type { BenchStore } from './bench-store';
import { railButton } from './rail-button';
import { useChosen } from './use-bench';

interface PartsTrayProps {
  readonly store: BenchStore;
  readonly control: TrayControl;
}

/** Pulled farther than this the part comes along; less is a press, px. */
const pulled = 6;

/**
 * Parts to be put on the mechanism: pull one on to the drawing, or press one and then the place it
 * goes to, on the drawing or here.
 */
export function PartsTray({ store, control }: PartsTrayProps) {
  const inHand = useChosen(store, (moment) => moment.inHand);
  const [hand, setHand] = useState<{ readonly x: number; readonly y: number } | null>(null);
  const layBack = (event: KeyboardEvent) => {
    if (event.key === 'Escape') store.take(null);
  };
  const pull = (part: TrayPart) => (event: PointerEvent<HTMLButtonElement>) => {
    if (event.button !== 0) return;
    followPull(event, { onHold: () => store.take(part), onHand: setHand });
  };
  return (
    <fieldset className="col-span-full">
      <legend className="text-[0.9375rem] font-semibold">{control.label}</legend>
      <div className="mt-1 flex flex-wrap gap-1">
        {control.parts.map((part) => (
          <button
            key={part.value}
            type="button"
            aria-label={part.name}
            aria-pressed={inHand?.value === part.value}
            className={`${railButton('square')} touch-none rounded-full font-mono aria-pressed:border-2 aria-pressed:border-brass aria-pressed:bg-brass-fill aria-pressed:text-on-brass`}
            onPointerDown={pull(part)}
            onKeyDown={layBack}
            onClick={() => store.take(inHand?.value === part.value ? null : part)}
          >
            {part.label}
          </button>
        ))}
      </div>
      <p className="mt-1 text-[0.9375rem] text-pencil" role="status">
        {inHand
          ? `In your hand: ${inHand.name}. Press the one it replaces, on the drawing or here.`
          : 'Pull one on to the drawing, or press one and then the place it goes to.'}
      </p>
      {inHand ? (
        <div className="mt-1 flex flex-wrap gap-1">
          {control.places.map(({ key, label }) => (
            <button
              key={key}
              type="button"
              className={railButton()}
              onKeyDown={layBack}
              onClick={() => store.putAt(key)}
            >
              {label}
            </button>
          ))}
          <button type="button" className={railButton()} onClick={() => store.take(null)}>
            Lay it back
          </button>
        </div>
      ) : null}
      {hand && inHand ? (
        <span
          aria-hidden
          className="pointer-events-none fixed z-10 grid size-12 -translate-1/2 place-items-center rounded-full border-2 border-brass bg-brass-fill font-mono text-on-brass shadow-md"
          style={{ left: hand.x, top: hand.y }}
        >
          {inHand.label}
        </span>
      ) : null}
    </fieldset>
  );
}

interface Pull {
  readonly onHold: () => void;
  readonly onHand: (at: { readonly x: number; readonly y: number } | null) => void;
}

/** Follows a pointer that pulls a part; the drawing takes what is let go over it. */
function followPull(event: PointerEvent<HTMLButtonElement>, { onHold, onHand }: Pull): void {
  const { pointerId, clientX, clientY, currentTarget } = event;
  // A touch is bound to where it began; what it is let go over must hear of it.
  if (currentTarget.releasePointerCapture) currentTarget.releasePointerCapture(pointerId);
  let along = false;
  const stop = new AbortController();
  const listen = (
    type: 'pointermove' | 'pointerup' | 'pointercancel',
    act: (at: MouseEvent) => void,
  ) => window.addEventListener(type, act, { signal: stop.signal });
  listen('pointermove', (at) => {
    if (!along && Math.hypot(at.clientX - clientX, at.clientY - clientY) > pulled) {
      along = true;
      onHold();
    }
    if (along) onHand({ x: at.clientX, y: at.clientY });
  });
  const end = () => {
    stop.abort();
    onHand(null);
  };
  listen('pointerup', end);
  listen('pointercancel', end);
}
