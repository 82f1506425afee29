import { useEffect, useState, useSyncExternalStore } from 'react';
import { createBenchStore, type BenchMoment, type BenchStore } from './bench-store';
import type { BenchSpec } from '@/lib/scene/bench-spec';

/** A bench's store, made once for the life of the component. */
export function useBenchStore(spec: BenchSpec): BenchStore {
  const [store] = useState(() => createBenchStore(spec));
  return store;
}

/**
 * One part of the moment, as words and controls show it; what uses it is rendered anew only when
 * that part has changed. `choose` must give the same value for the same moment.
 */
export function useChosen<T>(store: BenchStore, choose: (moment: BenchMoment) => T): T {
  const read = () => choose(store.shown());
  return useSyncExternalStore(store.onShown, read, read);
}

/**
 * Writes the moment straight into the page, after every rendering and whenever it is shown anew: for
 * figures that follow the drive, so that a bench can run without React.
 */
export function useWriting(store: BenchStore, write: (moment: BenchMoment) => void): void {
  useEffect(() => {
    const now = () => write(store.shown());
    now();
    return store.onShown(now);
  });
}

const settledAfter = 600;

/** The moment that was last left alone for a while: what is worth saying aloud. */
export function useSettled(store: BenchStore): BenchMoment {
  const [settled, setSettled] = useState(store.shown);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const stop = store.onShown(() => {
      clearTimeout(timer);
      if (store.shown().running) return;
      timer = setTimeout(() => setSettled(store.shown()), settledAfter);
    });
    return () => {
      clearTimeout(timer);
      stop();
    };
  }, [store]);
  return settled;
}

/** Whether the person has asked for less motion: on their device, or on their account page. */
export function useReducedMotion(): boolean {
  const device = useMedia('(prefers-reduced-motion: reduce)');
  const account = useSyncExternalStore(
    () => () => undefined,
    () => document.documentElement.dataset.motion === 'less',
    () => false,
  );
  return device || account;
}

function useMedia(query: string): boolean {
  return useSyncExternalStore(
    (changed) => {
      const media = window.matchMedia(query);
      media.addEventListener('change', changed);
      return () => media.removeEventListener('change', changed);
    },
    () => window.matchMedia(query).matches,
    () => false,
  );
}

/** Whether any of an element is on the screen. */
export function useOnScreen(element: Element | null): boolean {
  const [onScreen, setOnScreen] = useState(true);
  useEffect(() => {
    if (!element || typeof IntersectionObserver === 'undefined') return;
    const observer = new IntersectionObserver((entries) => {
      const last = entries.at(-1);
      if (last) setOnScreen(last.isIntersecting);
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, [element]);
  return onScreen;
}

/** One step of a stepped run lasts this long, s. */
const stepEvery = 0.7;

/**
 * Runs the drive while it is asked to and on the screen: one loop, the position a function of the
 * time since it began. With less motion asked for it goes in steps.
 */
export function useRunning(store: BenchStore, onScreen: boolean): void {
  const running = useChosen(store, (moment) => moment.running);
  const pace = useChosen(store, (moment) => moment.pace);
  const model = useChosen(store, (moment) => moment.model);
  const stepped = useReducedMotion();
  const { fromShown, toShown, step, pace: control } = model.drive;
  useEffect(() => {
    if (!running || !onScreen) return;
    const from = store.moment().drive;
    const way = Math.sign(toShown(from + control.perSecond) - toShown(from)) || 1;
    let began: number | null = null;
    let frame = requestAnimationFrame(function draw(time) {
      began ??= time;
      const elapsed = (time - began) / 1000;
      const drive = stepped
        ? fromShown(toShown(from) + way * step * Math.floor(elapsed / stepEvery))
        : from + pace * control.perSecond * elapsed;
      if (drive !== store.moment().drive) store.runAt(drive, time);
      if (store.moment().running) frame = requestAnimationFrame(draw);
    });
    return () => cancelAnimationFrame(frame);
  }, [store, running, onScreen, pace, stepped, control, fromShown, toShown, step]);
}
