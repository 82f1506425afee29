import { vi } from 'vitest';

/** A path that nobody traces. */
class NoPath {
  lineTo() {}
  arc() {}
  closePath() {}
}

/**
 * A canvas that draws nothing, and a box of a given size around it.
 * @returns what has been written on it
 */
export function stubCanvas(size?: { readonly width: number; readonly height: number }): string[] {
  const written: string[] = [];
  const context = new Proxy(
    {},
    {
      get: (_, key) => {
        if (key === 'fillText') return (text: string) => written.push(text);
        if (key === 'measureText') return () => ({ width: 40 });
        if (key === 'getImageData') return () => ({ data: new Uint8ClampedArray(4) });
        return () => undefined;
      },
      set: () => true,
    },
  );
  vi.spyOn(HTMLCanvasElement.prototype, 'getContext').mockImplementation(
    () => context as CanvasRenderingContext2D,
  );
  vi.stubGlobal('Path2D', NoPath);
  vi.stubGlobal(
    'ResizeObserver',
    class {
      constructor(private readonly changed: ResizeObserverCallback) {}
      observe() {
        if (!size) return;
        const entry = { contentRect: { ...size } } as ResizeObserverEntry;
        this.changed([entry], this as unknown as ResizeObserver);
      }
      unobserve() {}
      disconnect() {}
    },
  );
  return written;
}

/** A page that is light, moves, and can be told to move less. */
export function stubMedia(): { readonly reduce: () => void } {
  let reduced = false;
  vi.stubGlobal('matchMedia', (query: string) => ({
    get matches() {
      return reduced && query.includes('reduced-motion');
    },
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
  return {
    reduce: () => {
      reduced = true;
    },
  };
}

/** Frames that come when they are told to. */
export function dispatchFrames() {
  let next = 1;
  const waiting = new Map<number, FrameRequestCallback>();
  vi.stubGlobal('requestAnimationFrame', (callback: FrameRequestCallback) => {
    waiting.set(next, callback);
    return next++;
  });
  vi.stubGlobal('cancelAnimationFrame', (id: number) => waiting.delete(id));
  return {
    waiting: () => waiting.size,
    run: (time: number) => {
      const due = [...waiting.values()];
      waiting.clear();
      due.forEach((callback) => callback(time));
    },
  };
}
