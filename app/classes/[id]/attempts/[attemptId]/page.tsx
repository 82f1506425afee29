import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Givens } from '@/app/_components/givens';
import { MarkSign } from '@/components/progress/mark';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findAttemptInClass } from '@/lib/data/class-work';
import { AttemptFacts } from './_components/attempt-facts';
import { AttemptTalk } from './_components/attempt-talk';
import { AttemptParts } from './_components/attempt-parts';

export const metadata: Metadata = { title: 'An answer' };

interface AttemptPageProps {
  readonly params: Promise<{ readonly id: string; readonly attemptId: string }>;
}

export default async function AttemptPage({ params }: AttemptPageProps) {
  const { id, attemptId } = await params;
  const found = await findAttemptInClass(await requireViewer(), id, attemptId);
  if (found === null) notFound();
  return (
    <Page>
      <PageHeading
        eyebrow={
          <>
            <Link href={`/classes/${id}`} prefetch={false} className="link link-target">
              {found.className}
            </Link>
            {' · '}
            <Link
              href={`/classes/${id}/learners/${found.learnerId}`}
              prefetch={false}
              className="link link-target"
            >
              {found.name}
            </Link>
          </>
        }
      >
        {found.title}
      </PageHeading>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <div className="min-w-0">
          <Section title="What was asked">
            <p className="mb-4 max-w-measure">{found.prompt}</p>
            <Givens givens={found.givens} />
          </Section>
          <Section title="What was answered">
            <AttemptParts attempt={found.attempt} />
          </Section>
        </div>
        <div className="min-w-0">
          <Section title="How it was marked">
            <p className="mb-3 text-lg">
              <MarkSign mark={found.attempt.verdict} />
            </p>
            <AttemptFacts found={found} />
          </Section>
          <AttemptTalk found={found} />
        </div>
      </div>
    </Page>
  );
}
