import { notFound } from 'next/navigation';
import { requireViewer } from '@/lib/auth/viewer';
import { findClass, type ClassFound } from '@/lib/data/classes';

/** What every page of a class takes from its address. */
export interface ClassPageProps {
  readonly params: Promise<{ readonly id: string }>;
}

/** The class of a page, or not found: for anybody but its staff it is not there. */
export async function requireClass({ params }: ClassPageProps): Promise<ClassFound> {
  const found = await findClass(await requireViewer(), (await params).id);
  if (found === null) notFound();
  return found;
}
