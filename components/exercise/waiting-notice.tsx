'use client';

import { useQueryClient } from '@tanstack/react-query';
import { Button, ButtonLink } from '@/components/ui/button';
import { refreshWaiting, useDelivery, useWaitingAnswers } from '@/lib/browser/use-waiting-answers';
import { discardAnswer } from '@/lib/browser/waiting-answers';

interface WaitingNoticeProps {
  /** Who is signed in, or null. */
  readonly personId: string | null;
  readonly signInHref: string;
}

const edge = 'mt-4 rounded border border-l-[6px] border-plum bg-paper px-4 py-3 print:hidden';

/**
 * Says that answers wait on this device, delivers this person's own as soon as it can, and tells
 * anybody else no more than that some wait.
 */
export function WaitingNotice({ personId, signInHref }: WaitingNoticeProps) {
  const client = useQueryClient();
  const waiting = useWaitingAnswers();
  const deliver = useDelivery(personId);
  const mine = waiting.filter((answer) => answer.personId === personId);
  const refused = mine.filter((answer) => answer.refused !== undefined);
  const unsent = mine.length - refused.length;
  const others = waiting.length - mine.length;
  const discard = async (key: string) => {
    await discardAnswer(key);
    await refreshWaiting(client);
  };
  return (
    <div role="status" className="mx-auto w-full max-w-[1148px] px-4 sm:px-6">
      {unsent > 0 ? (
        <div className={edge}>
          <p className="font-semibold text-plum">
            {unsent === 1 ? 'One answer of yours waits' : `${unsent} answers of yours wait`} on this
            device.
          </p>
          <p>It is sent as soon as the network is back, once, even if this page is closed first.</p>
          <Button variant="quiet" className="mt-2" onClick={() => void deliver()}>
            Try to send now
          </Button>
        </div>
      ) : null}
      {others > 0 ? (
        <div className={edge}>
          <p className="font-semibold text-plum">
            {personId === null
              ? 'An answer waits on this device.'
              : 'Another person’s answer waits on this device.'}
          </p>
          <p>It stays here, unread, until the person who gave it signs in.</p>
          {personId === null ? (
            <ButtonLink variant="quiet" href={signInHref} className="mt-2">
              Sign in
            </ButtonLink>
          ) : null}
        </div>
      ) : null}
      {refused.map((answer) => (
        <div key={answer.key} className={edge}>
          <p className="font-semibold text-plum">Your answer to “{answer.title}” did not count.</p>
          <p>{answer.refused}</p>
          <Button variant="quiet" className="mt-2" onClick={() => void discard(answer.key)}>
            I have read this
          </Button>
        </div>
      ))}
    </div>
  );
}
