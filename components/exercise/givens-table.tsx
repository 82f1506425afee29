import type { RoundView } from '@/lib/schemas/round';

/** What is given, each with its symbol, in the face that dimensions are written in. */
export function GivensTable({
  givens,
}: {
  readonly givens: readonly RoundView['givens'][number][];
}) {
  if (givens.length === 0) return null;
  return (
    <dl className="mt-4 flex max-w-4xl flex-wrap overflow-hidden border-t border-l border-rule">
      {givens.map((given) => (
        <div
          key={`${given.symbol} ${given.label}`}
          className="min-w-32 flex-1 basis-32 border-r border-b border-rule bg-paper px-3 py-2"
        >
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
