interface GivensProps {
  readonly givens: readonly {
    readonly symbol: string;
    readonly label: string;
    readonly value: string;
    readonly unit: string;
  }[];
}

/** The numbers of a variant, each under its name. */
export function Givens({ givens }: GivensProps) {
  if (givens.length === 0) return null;
  return (
    <dl className="flex flex-wrap border-t border-l border-rule">
      {givens.map(({ symbol, label, value, unit }) => (
        <div
          key={`${symbol}${label}`}
          className="min-w-36 grow border-r border-b border-rule px-3 py-2"
        >
          <dt className="text-[0.9375rem] text-pencil">
            {label}
            {symbol ? <span className="ml-1.5 font-mono">{symbol}</span> : null}
          </dt>
          <dd className="font-mono">
            {value}
            {unit ? ` ${unit}` : ''}
          </dd>
        </div>
      ))}
    </dl>
  );
}
