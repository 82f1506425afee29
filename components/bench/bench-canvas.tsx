'use client';

import type Konva from 'konva/lib/Core';
import 'konva/lib/shapes/Circle';
import { useEffect, useRef, useState } from 'react';
import { Circle, Layer, Shape, Stage } from 'react-konva/lib/ReactKonvaCore';
import type { BenchStore } from './bench-store';
import { onThemeChange, readInk } from './colours';
import { paintScene } from './painter';
import { takeHold } from './take-hold';
import { useChosen } from './use-bench';
import { pixelAt, viewOf, type Zoom } from './view';

/** A fingertip on the page, px. */
const fingertip = 22;

interface BenchCanvasProps {
  readonly store: BenchStore;
  readonly width: number;
  readonly height: number;
  readonly zoom: Zoom;
  readonly onPan: (shareX: number, shareY: number) => void;
  readonly onReady: () => void;
}

/**
 * The drawing on a canvas. Every frame goes from the store to the canvas without React, which hears
 * only of another mechanism; the places to take hold of follow at a reading pace.
 */
export function BenchCanvas({ store, width, height, zoom, onPan, onReady }: BenchCanvasProps) {
  const model = useChosen(store, (moment) => moment.model);
  const frame = useChosen(store, (moment) => moment.frame);
  const drawing = useRef<Konva.Shape>(null);
  const holds = useRef<Konva.Layer>(null);
  const [themes, setThemes] = useState(0);
  const view = viewOf(frame, width, height, zoom);
  const handles = model.handles(store.moment().drive);
  const inHand = useChosen(store, (moment) => moment.inHand) !== null;

  useEffect(() => onThemeChange(() => setThemes((count) => count + 1)), []);
  useEffect(() => {
    document.fonts?.ready.then(() => setThemes((count) => count + 1)).catch(() => undefined);
  }, []);

  useEffect(() => {
    const [shape, holdLayer] = [drawing.current, holds.current];
    const layer = shape?.getLayer();
    const container = layer?.getStage().container();
    if (!shape || !layer || !holdLayer || !container) return;
    const ink = readInk(container);
    const seen = () => viewOf(store.moment().frame, width, height, zoom);
    shape.sceneFunc((context) => {
      const { model: at, showing: shown, ...state } = store.moment();
      const density = layer.getCanvas().getPixelRatio();
      const sheet = { pen: context._context, view: seen(), width, density, ink };
      paintScene(sheet, at.scene(state, shown));
    });
    const paint = () => layer.drawScene();
    const place = () => {
      const { model: at, drive } = store.moment();
      const now = seen();
      for (const handle of at.handles(drive)) {
        const hold = holdLayer.children.find((node) => node.id() === handle.id);
        hold?.position(pixelAt(now, handle.at));
      }
    };
    paint();
    place();
    onReady();
    const stops = [store.onFrame(paint), store.onShown(place)];
    return () => stops.forEach((stop) => stop());
  }, [store, width, height, zoom, themes, onReady]);

  return (
    <Stage
      width={width}
      height={height}
      onPointerDown={(event) => {
        const stage = event.target.getStage();
        if (event.target === stage && zoom.factor > 1) takeHold.ofGround(stage, event.evt, onPan);
      }}
      onPointerUp={(event) => {
        const stage = event.target.getStage();
        if (stage) takeHold.putDown(stage, event.evt, store, view);
      }}
    >
      <Layer listening={false}>
        <Shape ref={drawing} />
      </Layer>
      <Layer ref={holds} listening={!inHand}>
        {handles.map((handle) => (
          <Circle
            key={handle.id}
            id={handle.id}
            {...pixelAt(view, handle.at)}
            radius={Math.max(fingertip, handle.reach * view.scale)}
            fill="transparent"
            onPointerEnter={(event) => takeHold.hover(event.target.getStage(), true)}
            onPointerLeave={(event) => takeHold.hover(event.target.getStage(), false)}
            onPointerDown={(event) =>
              takeHold.ofHandle(event.target.getStage(), event.evt, store, handle, () =>
                viewOf(store.moment().frame, width, height, zoom),
              )
            }
          />
        ))}
      </Layer>
    </Stage>
  );
}
