'use client';

import { useQuery } from '@tanstack/react-query';
import type { ClassProgress } from '@/lib/schemas/class-progress';
import { fetchIfChanged, type Kept } from './fetch-if-changed';
import { queryKeys } from './query-keys';

/** How often an open page looks for new answers, in milliseconds; a page in the background does not. */
const LOOK_AGAIN = 4_000;

/**
 * The progress of a class, looked at again every few seconds while the page is seen. As long as
 * nothing has changed the server answers so, and sends nothing else.
 */
export function useClassProgress(
  classId: string,
  names: 'shown' | 'hidden',
  initial: ClassProgress | null = null,
) {
  const queryKey = queryKeys.classProgress(classId, names);
  const path = `/api/classes/${encodeURIComponent(classId)}/progress`;
  return useQuery<Kept<ClassProgress>, Error, ClassProgress>({
    queryKey,
    queryFn: ({ signal, client }) =>
      fetchIfChanged(
        names === 'hidden' ? `${path}?names=hidden` : path,
        client.getQueryData<Kept<ClassProgress>>(queryKey),
        signal,
      ),
    select: ({ value }) => value,
    initialData: initial === null ? undefined : { tag: null, value: initial },
    refetchInterval: LOOK_AGAIN,
  });
}
