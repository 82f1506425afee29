import { modelOf } from '@/lib/scene/model-of';
import type { BenchModel, DriveState, Showing, TrayPart } from '@/lib/scene/bench-model';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import type { Bounds } from '@/lib/scene/scene';
import { frameFor } from './view';

/** All that a bench shows at one moment. */
export interface BenchMoment extends DriveState {
  readonly model: BenchModel;
  /** What the drawing shows; it changes only when the mechanism no longer fits it. */
  readonly frame: Bounds;
  readonly showing: Showing;
  readonly running: boolean;
  readonly pace: number;
  readonly canUndo: boolean;
  /** The part taken from the tray, until it is put somewhere or laid back. */
  readonly inHand: TrayPart | null;
  /** Counts upwards with every change that is worth saying aloud once it has settled. */
  readonly change: number;
}

/**
 * One bench's state outside React: the canvas follows every frame, the words and controls follow
 * at a reading pace, and nothing is rendered anew sixty times a second.
 */
export interface BenchStore {
  readonly moment: () => BenchMoment;
  /** The moment as words and controls show it, refreshed some ten times a second while it runs. */
  readonly shown: () => BenchMoment;
  readonly onFrame: (listener: () => void) => () => void;
  readonly onShown: (listener: () => void) => () => void;
  /** Moves the driver; with the `time` of a pull, words and controls follow at a reading pace. */
  readonly moveTo: (drive: number, change: string, time?: number) => void;
  readonly stepBy: (steps: number) => void;
  /** Changes the setting; while `held` by a hand the frame stays as it is. */
  readonly setting: (spec: BenchSpec, change: string, held?: boolean) => void;
  /** Takes a part from the tray into the hand, or lays it back. */
  readonly take: (part: TrayPart | null) => void;
  /** Puts the part in hand where the setting of this key is. */
  readonly putAt: (key: string) => void;
  /** Frames the mechanism anew. */
  readonly fit: () => void;
  readonly run: (running: boolean) => void;
  readonly runAt: (drive: number, time: number) => void;
  readonly pace: (pace: number) => void;
  readonly show: (showing: Partial<Showing>) => void;
  readonly backToStart: () => void;
  readonly undo: () => void;
  /** Ends a pull or a slide, so that the next one is undone apart from it. */
  readonly settle: () => void;
}

interface Past {
  readonly spec: BenchSpec;
  readonly drive: number;
}

const shownEvery = 100;
const undoDepth = 60;

/** A bench at its start. */
export function createBenchStore(start: BenchSpec): BenchStore {
  let now = startOf(start);
  let shown = now;
  let shownAt = 0;
  let past: readonly Past[] = [];
  let lastChange: string | null = null;
  const frameListeners = new Set<() => void>();
  const shownListeners = new Set<() => void>();

  const publish = (next: BenchMoment, time?: number) => {
    now = next;
    frameListeners.forEach((listener) => listener());
    if (time !== undefined && time - shownAt < shownEvery) return;
    shownAt = time ?? 0;
    shown = now;
    shownListeners.forEach((listener) => listener());
  };
  const remember = (change: string) => {
    if (change === lastChange) return;
    lastChange = change;
    past = [...past, { spec: now.model.spec, drive: now.drive }].slice(-undoDepth);
  };
  const moveTo = (drive: number, time?: number) => {
    const admitted = now.model.admit(drive);
    publish({ ...moved(now, admitted), canUndo: past.length > 0 }, time);
  };
  const replace = (spec: BenchSpec, drive: number, held = false) => {
    const model = modelOf(spec);
    const frame = held ? now.frame : frameFor(now.frame, model.bounds);
    const next = { ...now, model, frame, canUndo: past.length > 0, change: now.change + 1 };
    publish(moved(next, model.admit(drive)));
  };

  return {
    moment: () => now,
    shown: () => shown,
    onFrame: (listener) => {
      frameListeners.add(listener);
      return () => frameListeners.delete(listener);
    },
    onShown: (listener) => {
      shownListeners.add(listener);
      return () => shownListeners.delete(listener);
    },
    moveTo: (drive, change, time) => {
      remember(change);
      moveTo(drive, time);
    },
    stepBy: (steps) => {
      const { toShown, fromShown, step } = now.model.drive;
      remember('step');
      moveTo(fromShown(toShown(now.drive) + steps * step));
    },
    setting: (spec, change, held) => {
      remember(change);
      replace(spec, now.drive, held);
    },
    take: (inHand) => publish({ ...now, inHand }),
    putAt: (key) => {
      const { inHand, model } = now;
      if (!inHand) return;
      lastChange = null;
      remember(`put ${key}`);
      now = { ...now, inHand: null };
      replace(model.set(key, inHand.value), now.drive);
      lastChange = null;
    },
    fit: () => publish({ ...now, frame: now.model.bounds }),
    run: (running) => {
      if (running) remember('run');
      lastChange = null;
      publish({ ...now, running, canUndo: past.length > 0, change: now.change + 1 });
    },
    runAt: (drive, time) => {
      const admitted = now.model.admit(drive);
      if (admitted === drive) moveTo(drive, time);
      else publish({ ...moved(now, admitted), running: false });
    },
    pace: (pace) => publish({ ...now, pace }),
    show: (showing) => publish({ ...now, showing: { ...now.showing, ...showing } }),
    backToStart: () => {
      remember('back to the start');
      lastChange = null;
      const { showing, pace } = now;
      publish({ ...startOf(start), showing, pace, canUndo: true, change: now.change + 1 });
    },
    undo: () => {
      const before = past.at(-1);
      if (before === undefined) return;
      past = past.slice(0, -1);
      lastChange = null;
      now = { ...now, running: false };
      replace(before.spec, before.drive);
    },
    settle: () => {
      lastChange = null;
      publish({ ...now, frame: frameFor(now.frame, now.model.bounds) });
    },
  };
}

function startOf(spec: BenchSpec): BenchMoment {
  const model = modelOf(spec);
  const drive = model.admit(spec.drive ?? model.drive.start);
  return {
    model,
    frame: model.bounds,
    drive,
    swept: { from: drive, to: drive },
    showing: { tracing: true, dimensions: true },
    running: false,
    pace: model.drive.pace.usual,
    canUndo: false,
    inHand: null,
    change: 0,
  };
}

function moved(moment: BenchMoment, drive: number): BenchMoment {
  const swept = {
    from: Math.min(moment.swept.from, drive),
    to: Math.max(moment.swept.to, drive),
  };
  return { ...moment, drive, swept, change: moment.change + 1 };
}
