import type { Metadata } from 'next';
import { ClassProgress } from '@/components/progress/class-progress';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findClassProgress } from '@/lib/data/class-progress';
import { ClassFrame } from './_components/class-frame';
import { requireClass, type ClassPageProps } from './_components/class-of-page';

export const metadata: Metadata = { title: 'Class' };

export default async function ClassPage(props: ClassPageProps) {
  const found = await requireClass(props);
  const progress = await findClassProgress(await requireViewer(), found.classId);
  return (
    <ClassFrame found={found}>
      <Section title="How everybody stands">
        <ClassProgress classId={found.classId} initial={progress} />
      </Section>
    </ClassFrame>
  );
}
