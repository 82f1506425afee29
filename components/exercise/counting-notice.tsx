import type { Counting } from '@/lib/schemas/round';

/** What an answer counts for, where a limit or a due time makes that worth saying. */
export function CountingNotice({ counting }: { readonly counting: readonly Counting[] }) {
  const lines = counting.flatMap((one) => sentenceOf(one) ?? []);
  if (lines.length === 0) return null;
  return (
    <ul className="mt-3 max-w-2xl text-pencil">
      {lines.map((line) => (
        <li key={line}>{line}</li>
      ))}
    </ul>
  );
}

function sentenceOf({ className, outcome, n, allowed, late }: Counting): string | null {
  switch (outcome) {
    case 'closed':
      return `${className}: this is closed by now, so the answer is marked and kept, and does not count.`;
    case 'none left':
      return `${className}: ${n === 1 ? 'your one attempt counts' : `your ${n} attempts count`} already, so this one is marked and kept as practice.`;
    case 'counted':
      if (allowed === null) return late ? `${className}: it counts, marked late.` : null;
      return `${className}: attempt ${n} of ${allowed}${late ? ', marked late' : ''}.`;
  }
}
