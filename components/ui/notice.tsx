import clsx from 'clsx';
import type { ReactNode } from 'react';

type Tone = 'plain' | 'right' | 'wrong' | 'again';

const tones: Record<Tone, { edge: string; text: string; sign: string }> = {
  plain: { edge: 'border-chalk', text: 'text-chalk', sign: '›' },
  right: { edge: 'border-leaf', text: 'text-leaf', sign: '✓' },
  wrong: { edge: 'border-madder', text: 'text-madder', sign: '✕' },
  again: { edge: 'border-plum', text: 'text-plum', sign: '↑' },
};

interface NoticeProps {
  readonly tone?: Tone;
  readonly title: ReactNode;
  readonly children?: ReactNode;
  /** Makes the notice speak up when it appears: `alert` for what went wrong, `status` otherwise. */
  readonly role?: 'alert' | 'status';
}

/** A framed message with a heavy edge; the sign and the words tell its tone without its colour. */
export function Notice({ tone = 'plain', title, children, role }: NoticeProps) {
  const look = tones[tone];
  return (
    <div
      role={role}
      className={clsx('mb-6 rounded border border-l-[6px] bg-paper px-4 py-3', look.edge)}
    >
      <p className={clsx('font-semibold', look.text)}>
        <span aria-hidden="true">{look.sign} </span>
        {title}
      </p>
      {children ? <div className="mt-1 max-w-measure">{children}</div> : null}
    </div>
  );
}
