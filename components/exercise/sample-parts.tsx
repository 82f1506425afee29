'use client';

import { Bench } from '@/components/bench/bench';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import type { PartView, RoundView } from '@/lib/schemas/round';
import { OptionBench } from './choice-field';
import { Criteria } from './setting-field';

/** What an exercise asks for, to be looked at and driven by somebody who cannot answer it. */
export function SampleParts({ round }: { readonly round: RoundView }) {
  return round.parts.map((part) => (
    <div key={part.key} className="mt-5">
      <p className="mb-2 font-semibold">{part.label}</p>
      <SamplePart part={part} round={round} />
    </div>
  ));
}

function SamplePart({ part, round }: { readonly part: PartView; readonly round: RoundView }) {
  switch (part.kind) {
    case 'number':
      return <p className="text-pencil">{part.expects}</p>;
    case 'choice':
      return <SampleOptions options={part.options} />;
    case 'setting':
      return (
        <>
          <Criteria criteria={part.criteria} />
          {round.figure === undefined ? null : (
            <Bench spec={round.figure as BenchSpec} title={round.title} />
          )}
        </>
      );
    case 'design':
      return (
        <>
          <Criteria criteria={part.criteria} />
          <ul className="list-disc pl-6">
            {part.fields.map((field) => (
              <li key={field.key}>{field.label}</li>
            ))}
          </ul>
        </>
      );
  }
}

type Options = Extract<PartView, { kind: 'choice' }>['options'];

/** The options in words, or as benches that can be driven. */
function SampleOptions({ options }: { readonly options: Options }) {
  if (options.every(({ figure }) => figure === undefined)) {
    return (
      <ul className="list-disc pl-6">
        {options.map(({ id, label }) => (
          <li key={id}>{label}</li>
        ))}
      </ul>
    );
  }
  return (
    <ul className="grid gap-5 lg:grid-cols-2">
      {options.map((option) => (
        <li key={option.id} className="min-w-0">
          <OptionBench option={option} />
        </li>
      ))}
    </ul>
  );
}
