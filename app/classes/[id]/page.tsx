import type { Metadata } from 'next';
import { ClassProgress } from '@/components/progress/class-progress';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findClassProgress } from '@/lib/data/class-progress';
import { hideNames } from '@/lib/data/hidden-names';
import { ClassFrame } from './_components/class-frame';
import { requireClass, type ClassPageProps } from './_components/class-of-page';

export const metadata: Metadata = { title: 'Class' };

interface ProgressPageProps extends ClassPageProps {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

/** `?names=hidden` is the view for the projector: what it shows holds no name. */
export default async function ClassPage({ searchParams, ...props }: ProgressPageProps) {
  const found = await requireClass(props);
  const progress = await findClassProgress(await requireViewer(), found.classId);
  const names = (await searchParams).names === 'hidden' ? 'hidden' : 'shown';
  const shown = progress !== null && names === 'hidden' ? hideNames(progress) : progress;
  return (
    <ClassFrame found={found}>
      <Section title="How everybody stands">
        <ClassProgress key={names} classId={found.classId} initial={shown} names={names} />
      </Section>
    </ClassFrame>
  );
}
