'use client';

import dynamic from 'next/dynamic';
import { useCallback, useEffect, useMemo, useState } from 'react';
import { startScene } from '@/lib/scene/static-picture';
import { toSvg } from '@/lib/scene/to-svg';
import type { BenchStore } from './bench-store';
import type { Zoom } from './view';
import './drawing.css';

const BenchCanvas = dynamic(async () => (await import('./bench-canvas')).BenchCanvas, {
  ssr: false,
});

interface DrawingBoxProps {
  readonly store: BenchStore;
  readonly locked: boolean;
  readonly printing: boolean;
  readonly zoom: Zoom;
  readonly onPan: (shareX: number, shareY: number) => void;
  readonly onWidth: (width: number) => void;
  readonly labelledBy: string;
  readonly describedBy: string | undefined;
}

/**
 * The drawing: a still picture (whose last digits may differ between server and browser) from the first byte on, over which the canvas comes to stand at the
 * same size; on paper the still picture again, brought up to date.
 */
export function DrawingBox(props: DrawingBoxProps) {
  const { store, locked, printing, zoom, onPan, onWidth, labelledBy, describedBy } = props;
  const [box, setBox] = useState<HTMLDivElement | null>(null);
  const [size, setSize] = useState<{ width: number; height: number } | null>(null);
  const [live, setLive] = useState(false);
  const onReady = useCallback(() => setLive(true), []);
  const [aspect] = useState(() => {
    const { left, right, bottom, top } = store.moment().frame;
    return ((right - left) / (top - bottom)).toFixed(3);
  });
  const picture = useMemo(() => {
    const { model, frame, showing, ...state } = store.moment();
    const scene = locked ? startScene(model, true) : model.scene(state, showing);
    return toSvg({ ...scene, bounds: printing ? frame : scene.bounds });
  }, [store, locked, printing]);

  useEffect(() => {
    if (!box || typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver((entries) => {
      const { width, height } = entries.at(-1)?.contentRect ?? { width: 0, height: 0 };
      if (width > 0) setSize({ width, height });
      if (width > 0) onWidth(width);
    });
    observer.observe(box);
    return () => observer.disconnect();
  }, [box, onWidth]);

  return (
    <div
      ref={setBox}
      role="img"
      aria-labelledby={labelledBy}
      aria-describedby={describedBy}
      className="drawing-box relative w-full overflow-hidden bg-paper"
      style={{ aspectRatio: aspect }}
      data-live={live && !locked}
    >
      <div
        className="drawing-still absolute inset-0"
        suppressHydrationWarning
        dangerouslySetInnerHTML={{ __html: picture }}
      />
      {size && !locked ? (
        <div className="drawing-live absolute inset-0">
          <BenchCanvas store={store} {...size} zoom={zoom} onPan={onPan} onReady={onReady} />
        </div>
      ) : null}
    </div>
  );
}
