import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findStickingPoints } from '@/lib/data/sticking-points';
import { ClassFrame } from '../_components/class-frame';
import { requireClass, type ClassPageProps } from '../_components/class-of-page';
import { Items } from './_components/items';
import { Points } from './_components/points';

export const metadata: Metadata = { title: 'Sticking points' };

export default async function StickingPointsPage(props: ClassPageProps) {
  const found = await requireClass(props);
  const sticking = await findStickingPoints(await requireViewer(), found.classId);
  if (sticking === null) notFound();
  return (
    <ClassFrame found={found}>
      <Section title="Where the class is stuck">
        <Points classId={found.classId} points={sticking.points} />
      </Section>
      <Section title="How each exercise did, at first attempts">
        <Items items={sticking.items} />
      </Section>
    </ClassFrame>
  );
}
