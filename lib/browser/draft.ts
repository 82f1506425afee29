'use client';

import { useCallback, useSyncExternalStore } from 'react';
import type { ExerciseResponse } from '@/lib/schemas/round';

/** What has been typed, chosen or set so far, by part. */
export type Draft = ExerciseResponse['answers'];

const empty: Draft = {};
const kept = new Map<string, Draft>();
const listeners = new Set<() => void>();

function storageKey(roundId: string): string {
  return `hornbeam-draft-${roundId}`;
}

function read(roundId: string): Draft {
  const known = kept.get(roundId);
  if (known !== undefined) return known;
  let draft = empty;
  try {
    const text = window.sessionStorage.getItem(storageKey(roundId));
    if (text !== null) draft = JSON.parse(text) as Draft;
  } catch {
    // No storage, or nothing in it that can be read: the page starts with empty fields.
  }
  kept.set(roundId, draft);
  return draft;
}

function write(roundId: string, draft: Draft): void {
  kept.set(roundId, draft);
  try {
    window.sessionStorage.setItem(storageKey(roundId), JSON.stringify(draft));
  } catch {
    // Where nothing can be stored, the draft lives as long as the page.
  }
  listeners.forEach((listener) => listener());
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/**
 * What was typed for a round, kept in this tab so that neither a reload nor an expired session
 * loses it.
 * @returns the draft and a function that replaces one part of it.
 */
export function useDraft(
  roundId: string,
): readonly [Draft, (part: string, answer: Draft[string]) => void] {
  const draft = useSyncExternalStore(
    subscribe,
    () => read(roundId),
    () => empty,
  );
  const change = useCallback(
    (part: string, answer: Draft[string]) => {
      write(roundId, { ...read(roundId), [part]: answer });
    },
    [roundId],
  );
  return [draft, change];
}
