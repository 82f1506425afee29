'use client';

import { useRouter } from 'next/navigation';
import { signIn } from 'next-auth/react';
import { useRef, useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { noteSignedInAgain } from '@/lib/browser/form-draft';
import { sentenceForSignIn } from './sign-in-sentence';

interface SignInFormProps {
  /** Where to go on to: a path on this site. */
  readonly next: string;
}

/** E-mail and password. A refusal keeps the address and says the same whoever it was. */
export function SignInForm({ next }: SignInFormProps) {
  const router = useRouter();
  const [pending, setPending] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const password = useRef<HTMLInputElement>(null);

  const send = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (pending) return;
    const data = new FormData(event.currentTarget);
    setPending(true);
    setRefusal(null);
    const refusedWith = await tryToSignIn(String(data.get('email')), String(data.get('password')));
    if (refusedWith === null) {
      // Pages seen while signed out may be kept with their redirect: forget them first.
      noteSignedInAgain(next);
      router.refresh();
      router.push(next);
      return;
    }
    setRefusal(refusedWith);
    setPending(false);
    password.current?.focus();
    password.current?.select();
  };

  return (
    <form method="post" onSubmit={(event) => void send(event)} className="max-w-md">
      {refusal ? <Notice tone="wrong" title={refusal} role="alert" /> : null}
      <TextField
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        spellCheck={false}
        required
      />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        ref={password}
        required
      />
      <Button type="submit" aria-disabled={pending || undefined}>
        {pending ? 'One moment …' : 'Sign in'}
      </Button>
    </form>
  );
}

async function tryToSignIn(email: string, password: string): Promise<string | null> {
  try {
    const answer = await signIn('credentials', { email, password, redirect: false });
    return answer?.ok && !answer.error ? null : sentenceForSignIn(answer?.error);
  } catch {
    return sentenceForSignIn('network');
  }
}
