import Link from 'next/link';
import { Notice } from '@/components/ui/notice';

/** Says that an instructor has said something about the learner's work, until it has been read. */
export function Unread({ unread }: Readonly<{ unread: number }>) {
  if (unread === 0) return null;
  return (
    <Notice
      tone="again"
      title={
        unread === 1
          ? 'Your instructor has said something about your work.'
          : `Your instructors have said ${unread} things about your work.`
      }
    >
      <Link href="/feedback" prefetch={false} className="link link-target">
        Read it
      </Link>
    </Notice>
  );
}
