'use client';

import { useState } from 'react';
import { Button } from './button';

const handOver = 'Hand this link over now: it is shown this once, works once, and for seven days.';

interface OneTimeLinkProps {
  readonly link: string;
  /** What to do with it; to hand it over, unless said otherwise. */
  readonly says?: string;
}

/** A link that is shown once: to be copied now and handed over. */
export function OneTimeLink({ link, says = handOver }: OneTimeLinkProps) {
  const [copied, setCopied] = useState(false);
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(link);
      setCopied(true);
    } catch {
      // Where the page may not reach the clipboard, the link can still be marked and copied by hand.
      setCopied(false);
    }
  };
  return (
    <div className="mb-6 rounded border border-l-[6px] border-brass bg-board px-4 py-3">
      <p className="font-semibold">{says}</p>
      <p className="my-2 font-mono text-[0.9375rem] break-all select-all">{link}</p>
      <div className="flex items-center gap-3">
        <Button variant="quiet" onClick={() => void copy()}>
          Copy the link
        </Button>
        <span role="status">{copied ? 'Copied.' : ''}</span>
      </div>
    </div>
  );
}
