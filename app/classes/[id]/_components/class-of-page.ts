import { notFound } from 'next/navigation';
import { cache } from 'react';
import { requireViewer } from '@/lib/auth/viewer';
import { findClass, type ClassFound } from '@/lib/data/classes';

/** What every page of a class takes from its address. */
export interface ClassPageProps {
  readonly params: Promise<{ readonly id: string }>;
}

/** The class of a page, looked up once a request; for anybody but its staff it is not there. */
export const requireClass = cache(async (classId: string): Promise<ClassFound> => {
  const found = await findClass(await requireViewer(), classId);
  if (found === null) notFound();
  return found;
});
