import type { Metadata } from 'next';
import Link from 'next/link';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { pegRule } from '@/lib/retention/peg';

export const metadata: Metadata = { title: 'For instructors' };

const gains = [
  {
    title: 'Lessons that can be handled',
    text: 'Each lesson has a mechanism to turn, drag and read before there is a rule to learn. Your learners commit to a guess first and see what happens after.',
  },
  {
    title: 'Exercises marked at once',
    text: 'Every learner has their own numbers, in millimetres or inches. Answers are checked by calculation, and a wrong one is told apart: half for whole, upside down, the wrong way round.',
  },
  {
    title: 'Who is stuck, and on what',
    text: 'One page a class: every learner and every lesson, with a peg for each skill. Open it down to the answer that was given and the slip behind it.',
  },
  {
    title: 'Answers for you alone',
    text: 'Open any exercise with fresh numbers, its worked solution and the slips we know. A learner’s page has no trace of them.',
  },
];

export default function ForInstructorsPage() {
  return (
    <Page>
      <PageHeading>For instructors</PageHeading>
      <p className="mb-8 max-w-measure text-xl text-pencil">
        Your learners can cut a joint. Hornbeam helps them to find the mechanism for the motion they
        want, to size it, and to know that it will run before a board is spoiled.
      </p>
      <ul className="mb-12 grid gap-x-10 gap-y-8 md:grid-cols-2">
        {gains.map(({ title, text }) => (
          <li key={title} className="border-t border-ink pt-3">
            <h2 className="mb-1 text-xl">{title}</h2>
            <p className="max-w-measure text-pencil">{text}</p>
          </li>
        ))}
      </ul>
      <Section title="How a peg goes home">
        <p className="mb-3 max-w-measure">{pegRule}</p>
        <p className="max-w-measure text-pencil">
          One lucky evening is not enough, and no setting changes that.
        </p>
      </Section>
      <Section title="How to begin">
        <p className="mb-5 max-w-measure">
          One installation is one workshop. Whoever looks after yours makes an account for you and
          puts you in charge of a class. Until then{' '}
          <Link href="/lessons" prefetch={false} className="link">
            every lesson is open to read
          </Link>
          , benches included.
        </p>
        <ButtonLink href="/sign-in">Sign in</ButtonLink>
      </Section>
    </Page>
  );
}
