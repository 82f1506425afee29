import type { Metadata } from 'next';
import { ClassProgress } from '@/components/progress/class-progress';
import { Section } from '@/components/ui/panel';
import { requireClass, type ClassPageProps } from '../_components/class-of-page';

export const metadata: Metadata = { title: 'Class' };

export default async function ClassPage({ params }: ClassPageProps) {
  const { classId } = await requireClass((await params).id);
  return (
    <Section title="How everybody stands">
      <ClassProgress classId={classId} />
    </Section>
  );
}
