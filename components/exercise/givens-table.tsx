import type { RoundView } from '@/lib/schemas/round';

/** What is given, each with its symbol, in the face that dimensions are written in. */
export function GivensTable({
  givens,
}: {
  readonly givens: readonly RoundView['givens'][number][];
}) {
  if (givens.length === 0) return null;
  return (
    <dl className="mt-4 grid grid-cols-[repeat(auto-fill,minmax(min(100%,11rem),1fr))] gap-px border border-rule bg-rule">
      {givens.map((given) => (
        <div key={`${given.symbol} ${given.label}`} className="bg-paper px-3 py-2">
          <dt className="text-[0.9375rem] text-pencil">
            {given.label}
            {given.symbol === '' ? null : <i className="pl-1.5 font-mono">{given.symbol}</i>}
          </dt>
          <dd className="font-mono">
            {given.value}
            {given.unit === '' ? null : ` ${given.unit}`}
          </dd>
        </div>
      ))}
    </dl>
  );
}
