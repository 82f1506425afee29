import Link from 'next/link';
import { Notice } from '@/components/ui/notice';

/** Says that an instructor has said something about the learner's answers, until it has been read. */
export function Unread({ unread }: Readonly<{ unread: number }>) {
  if (unread === 0) return null;
  return (
    <Notice
      tone="again"
      title={
        unread === 1
          ? 'Your instructor has said something about an answer of yours.'
          : `Your instructors have said ${unread} things about your answers.`
      }
    >
      <Link href="/feedback" prefetch={false} className="link link-target">
        Read it
      </Link>
    </Notice>
  );
}
