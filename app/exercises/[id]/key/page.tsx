import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Givens } from '@/app/_components/givens';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findFreshKey } from '@/lib/data/exercise-key';
import { KeyParts } from './_components/key-parts';

export const metadata: Metadata = { title: 'Answers and slips' };

interface KeyPageProps {
  readonly params: Promise<{ readonly id: string }>;
}

export default async function KeyPage({ params }: KeyPageProps) {
  const { id } = await params;
  const key = findFreshKey(await requireViewer(), id);
  if (key === null) notFound();
  return (
    <Page>
      <PageHeading
        eyebrow={
          <Link href="/exercises" prefetch={false} className="link link-target">
            Answers and slips
          </Link>
        }
      >
        {key.title}
      </PageHeading>
      <Section title="What is asked">
        <p className="mb-4 max-w-measure">{key.prompt}</p>
        <Givens givens={key.givens} />
        <p className="mt-4">
          <ButtonLink href={`/exercises/${id}/key?draw=${key.seed}`} variant="quiet">
            Draw other numbers
          </ButtonLink>
        </p>
      </Section>
      <Section title="Answers and slips">
        <KeyParts parts={key.parts} />
      </Section>
      <Section title="Hints">
        <ol className="max-w-measure list-decimal pl-6">
          {key.hints.map((hint) => (
            <li key={hint}>{hint}</li>
          ))}
        </ol>
      </Section>
      <Section title="Worked solution">
        <ol className="max-w-measure list-decimal pl-6">
          {key.solution.map((step) => (
            <li key={step}>{step}</li>
          ))}
        </ol>
      </Section>
    </Page>
  );
}
