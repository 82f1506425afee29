'use client';

import { signOut } from 'next-auth/react';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useWaitingAnswers } from '@/lib/browser/use-waiting-answers';

/** Signs out; where answers of this person still wait on the device, it says so first. */
export function SignOut({ personId }: Readonly<{ personId: string }>) {
  const [pending, setPending] = useState(false);
  const waiting = useWaitingAnswers().filter(
    (answer) => answer.personId === personId && !answer.refused,
  ).length;
  const leave = async () => {
    setPending(true);
    await signOut({ callbackUrl: '/' }).catch(() => setPending(false));
  };
  return (
    <>
      {waiting > 0 ? (
        <Notice
          tone="again"
          role="status"
          title={
            waiting === 1
              ? 'One answer still waits on this device.'
              : `${waiting} answers still wait on this device.`
          }
        >
          They have not been sent yet. If you sign out now they stay here, unmarked, until you sign
          in on this device again. Nobody else can send or read them in Hornbeam.
        </Notice>
      ) : null}
      <Button
        variant={waiting > 0 ? 'danger' : 'secondary'}
        aria-disabled={pending || undefined}
        onClick={() => {
          if (!pending) void leave();
        }}
      >
        {waiting > 0 ? 'Sign out all the same' : 'Sign out'}
      </Button>
    </>
  );
}
