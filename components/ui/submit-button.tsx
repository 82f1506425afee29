'use client';

import { useFormStatus } from 'react-dom';
import type { ComponentProps } from 'react';
import { Button } from './button';

type SubmitButtonProps = ComponentProps<typeof Button> & {
  /** What the button says while the form is on its way. */
  readonly pendingText?: string;
};

/** Sends the form it stands in; while that is on its way a second press does nothing. */
export function SubmitButton({
  pendingText = 'One moment …',
  children,
  ...rest
}: SubmitButtonProps) {
  const { pending } = useFormStatus();
  return (
    <Button
      type="submit"
      aria-disabled={pending || undefined}
      onClick={(event) => {
        if (pending) event.preventDefault();
      }}
      {...rest}
    >
      {pending ? pendingText : children}
    </Button>
  );
}
