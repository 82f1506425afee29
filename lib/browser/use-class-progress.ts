'use client';

import { useQuery } from '@tanstack/react-query';
import type { ClassProgress } from '@/lib/schemas/class-progress';
import { fetchJson } from './fetch-json';
import { queryKeys } from './query-keys';

/** How often an open page looks for new answers, in milliseconds; a page in the background does not. */
const LOOK_AGAIN = 20_000;

/** The progress of a class, looked at again while the page is open. */
export function useClassProgress(classId: string, initial: ClassProgress | null = null) {
  return useQuery({
    queryKey: queryKeys.classProgress(classId),
    queryFn: ({ signal }) =>
      fetchJson<ClassProgress>(`/api/classes/${encodeURIComponent(classId)}/progress`, { signal }),
    initialData: initial ?? undefined,
    refetchInterval: LOOK_AGAIN,
  });
}
