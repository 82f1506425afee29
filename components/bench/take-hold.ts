import type Konva from 'konva/lib/Core';
import type { Handle } from '@/lib/scene/bench-model';
import type { BenchStore } from './bench-store';
import { worldAt, type View } from './view';

/** What a pointer does on the canvas: it takes hold, pulls, and lets go. */
export const takeHold = { ofHandle, ofGround, hover, putDown };

/**
 * Pulls a handle until the pointer lets go. The driver follows the hand step by step, so that it
 * can be led round many times; a setting follows from where it was taken hold.
 */
function ofHandle(
  stage: Konva.Stage | null,
  event: PointerEvent,
  store: BenchStore,
  handle: Handle,
  view: () => View,
): void {
  if (!stage) return;
  store.run(false);
  const start = store.moment();
  const place = (move: PointerEvent) => worldAt(view(), pixelOf(stage, move));
  const from = place(event);
  let last = from;
  follow(stage, event, {
    move: (pointer) => {
      const to = place(pointer);
      const now = store.moment();
      const dragged =
        handle.moves === 'drive'
          ? now.model.drag(handle.id, last, to, now.drive)
          : start.model.drag(handle.id, from, to, start.drive);
      last = to;
      if (dragged.kind === 'drive') {
        store.moveTo(dragged.drive, `drag ${handle.id}`, pointer.timeStamp);
      }
      if (dragged.kind === 'spec') store.setting(dragged.spec, `drag ${handle.id}`, true);
    },
    end: () => store.settle(),
  });
}

/** Moves a zoomed drawing with the pointer, by shares of what is visible. */
function ofGround(
  stage: Konva.Stage,
  event: PointerEvent,
  pan: (shareX: number, shareY: number) => void,
): void {
  let last = pixelOf(stage, event);
  follow(stage, event, {
    move: (pointer) => {
      const to = pixelOf(stage, pointer);
      pan((last.x - to.x) / stage.width(), (to.y - last.y) / stage.height());
      last = to;
    },
    end: () => undefined,
  });
}

/** Puts the part in hand on whatever it is let go over. */
function putDown(stage: Konva.Stage, event: PointerEvent, store: BenchStore, view: View): void {
  const { inHand, model } = store.moment();
  const key = inHand ? model.placeAt(worldAt(view, pixelOf(stage, event))) : null;
  if (key !== null) store.putAt(key);
}

function hover(stage: Konva.Stage | null, over: boolean): void {
  if (stage) stage.container().style.cursor = over ? 'grab' : '';
}

interface Following {
  readonly move: (event: PointerEvent) => void;
  readonly end: () => void;
}

function follow(stage: Konva.Stage, event: PointerEvent, { move, end }: Following): void {
  const container = stage.container();
  const { pointerId } = event;
  if (container.setPointerCapture) container.setPointerCapture(pointerId);
  container.style.cursor = 'grabbing';
  const onMove = (next: PointerEvent) => {
    if (next.pointerId === pointerId) move(next);
  };
  const onEnd = (next: PointerEvent) => {
    if (next.pointerId !== pointerId) return;
    container.removeEventListener('pointermove', onMove);
    container.removeEventListener('pointerup', onEnd);
    container.removeEventListener('pointercancel', onEnd);
    container.style.cursor = '';
    end();
  };
  container.addEventListener('pointermove', onMove);
  container.addEventListener('pointerup', onEnd);
  container.addEventListener('pointercancel', onEnd);
}

function pixelOf(stage: Konva.Stage, event: PointerEvent) {
  const box = stage.container().getBoundingClientRect();
  return { x: event.clientX - box.left, y: event.clientY - box.top };
}
