'use client';

import { createContext, useContext, useMemo, useState, type ReactNode } from 'react';

interface BenchLock {
  readonly locked: boolean;
  readonly unlock: () => void;
}

const Lock = createContext<BenchLock>({ locked: false, unlock: () => undefined });

interface BenchLockProviderProps {
  /** True when the prediction has been stored before. */
  readonly predicted: boolean;
  readonly children: ReactNode;
}

/** Holds whether the lesson's benches are still locked behind its prediction, in this tab. */
export function BenchLockProvider({ predicted, children }: BenchLockProviderProps) {
  const [open, setOpen] = useState(false);
  const lock = useMemo(
    () => ({ locked: !predicted && !open, unlock: () => setOpen(true) }),
    [predicted, open],
  );
  return <Lock value={lock}>{children}</Lock>;
}

/** Whether the lesson's benches are locked, and how to unlock them. */
export function useBenchLock(): BenchLock {
  return useContext(Lock);
}
