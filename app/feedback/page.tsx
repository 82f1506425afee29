import type { Metadata } from 'next';
import { MarkSign } from '@/components/progress/mark';
import { sayWhen } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Empty } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listFeedback, type Feedback } from '@/lib/data/feedback';
import { haveRead } from './actions';

export const metadata: Metadata = { title: 'Said about your work' };

export default async function FeedbackPage() {
  const viewer = await requireViewer();
  const told = await listFeedback(viewer);
  return (
    <Page width="narrow">
      <PageHeading>Said about your work</PageHeading>
      {told.some(({ unread }) => unread) ? (
        <ActionForm action={haveRead} fields={[]} submit="I have read it" variant="secondary" />
      ) : null}
      {told.length === 0 ? (
        <Empty title="Nothing yet">What your instructors say about your work stands here.</Empty>
      ) : (
        <ul className="mt-6 divide-y divide-rule border-y border-rule">
          {told.map((one) => (
            <Told key={one.id} one={one} timeZone={viewer.timeZone} />
          ))}
        </ul>
      )}
    </Page>
  );
}

function Told({ one, timeZone }: Readonly<{ one: Feedback; timeZone: string }>) {
  return (
    <li className="py-4">
      <p className="font-semibold">
        {one.title} {one.unread ? <span className="text-plum">↑ new</span> : null}
      </p>
      <p className="text-[0.9375rem] text-pencil">
        {one.authorName}, {one.className}, {sayWhen(one.at, timeZone)}
      </p>
      {one.marked ? (
        <p className="my-1">
          Marked <MarkSign mark={one.marked} />
          {one.verdict ? (
            <>
              , and stands as <MarkSign mark={one.verdict} />
            </>
          ) : null}
        </p>
      ) : null}
      <p className="max-w-measure whitespace-pre-line">{one.body}</p>
    </li>
  );
}
