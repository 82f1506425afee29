import type { Metadata } from 'next';
import { Suspense } from 'react';
import { Loading } from '@/components/ui/loading';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { requireViewer } from '@/lib/auth/viewer';
import { TodayParts } from './_components/today-parts';

export const metadata: Metadata = { title: 'Today' };

export default async function TodayPage() {
  const viewer = await requireViewer();
  return (
    <Page>
      <PageHeading>Today</PageHeading>
      <Suspense fallback={<Loading lines={8} />}>
        <TodayParts viewer={viewer} />
      </Suspense>
    </Page>
  );
}
