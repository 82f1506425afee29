'use client';

import { useCallback, useEffect, useId, useState, type ReactNode } from 'react';
import { flushSync } from 'react-dom';
import type { BenchSpec, SettingValues } from '@/lib/scene/bench-spec';
import { lockedSpec } from '@/lib/scene/static-picture';
import { BenchWords } from './bench-words';
import { DrawingBox } from './drawing-box';
import { DriveRail } from './drive-rail';
import { SettingsPanel } from './settings-panel';
import { TitleStrip } from './title-strip';
import { useBenchStore, useChosen, useOnScreen, useRunning } from './use-bench';
import { ViewRail } from './view-rail';
import { fitted, panned, zoomedBy } from './view';

export interface BenchProps {
  readonly spec: BenchSpec;
  readonly title: string;
  /** Shows the start and nothing that a prediction asks for. */
  readonly locked?: boolean;
  /** What stands under a locked bench: how to unlock it. */
  readonly lockedNotice?: ReactNode;
  /** Told what is set, at the start and whenever it changes. */
  readonly onSettingChange?: (values: SettingValues) => void;
}

/** Millimetres of the page in a CSS pixel. */
const millimetresInAPixel = 25.4 / 96;
const nominalWidth = 720;

/**
 * An interactive drawing of a mechanism that can be driven, set and read. It begins anew when it is
 * given another spec.
 */
export function Bench(props: BenchProps) {
  return <BenchFrame key={`${JSON.stringify(props.spec)}${props.locked ?? false}`} {...props} />;
}

function BenchFrame({ spec, title, locked = false, lockedNotice, onSettingChange }: BenchProps) {
  const store = useBenchStore(locked ? lockedSpec(spec) : spec);
  const id = useId();
  const [frame, setFrame] = useState<HTMLElement | null>(null);
  const [width, setWidth] = useState(nominalWidth);
  const [zoom, setZoom] = useState(fitted);
  const printing = usePrinting();
  const model = useChosen(store, (moment) => moment.model);
  const { left, right } = useChosen(store, (moment) => moment.frame);
  useRunning(store, useOnScreen(frame));
  useTelling(model.values, onSettingChange);
  const onPan = useCallback(
    (x: number, y: number) => setZoom((old) => panned(old, store.moment().frame, x, y)),
    [store],
  );
  return (
    <section
      ref={setFrame}
      aria-labelledby={`${id}-title`}
      className="@container my-6 w-full border border-ink bg-paper"
    >
      <TitleStrip
        store={store}
        id={`${id}-title`}
        title={title}
        scale={(width / (right - left)) * zoom.factor * millimetresInAPixel}
        locked={locked}
      />
      <DrawingBox
        {...{ store, locked, printing, zoom, onPan }}
        onWidth={setWidth}
        labelledBy={`${id}-title`}
        describedBy={`${id}-words`}
      />
      {locked ? (
        <div className="border-t border-ink bg-board px-4 py-3">
          <p id={`${id}-words`} className="max-w-measure">
            {model.describe(store.moment().drive)}
          </p>
          {lockedNotice}
        </div>
      ) : (
        <>
          <div className="grid grid-cols-[minmax(0,1fr)] gap-2 border-t border-ink bg-board px-4 py-3 print:hidden">
            <DriveRail store={store} id={id} />
            <ViewRail
              {...{ store, zoom, onPan }}
              onZoom={(factor) => setZoom((old) => zoomedBy(old, factor))}
              onFit={() => {
                setZoom(fitted);
                store.fit();
              }}
            />
          </div>
          <SettingsPanel store={store} />
          <BenchWords store={store} id={`${id}-words`} printing={printing} />
        </>
      )}
    </section>
  );
}

/** Tells what is set, once for every change of it. */
function useTelling(values: SettingValues, tell: BenchProps['onSettingChange']): void {
  const text = JSON.stringify(values);
  useEffect(() => {
    tell?.(JSON.parse(text) as SettingValues);
  }, [text, tell]);
}

/** Whether the page is being laid out for paper. */
function usePrinting(): boolean {
  const [printing, setPrinting] = useState(false);
  useEffect(() => {
    const before = () => flushSync(() => setPrinting(true));
    const after = () => setPrinting(false);
    window.addEventListener('beforeprint', before);
    window.addEventListener('afterprint', after);
    return () => {
      window.removeEventListener('beforeprint', before);
      window.removeEventListener('afterprint', after);
    };
  }, []);
  return printing;
}
