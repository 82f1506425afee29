'use client';

import type { Draft } from '@/lib/browser/draft';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import type { PartView, RoundView } from '@/lib/schemas/round';
import { chosenOf, isAnswered, settingOf, typedOf } from './answers';
import { ChoiceField } from './choice-field';
import { DesignField } from './design-field';
import { NumberField } from './number-field';
import { SettingField } from './setting-field';

interface PartFieldProps {
  readonly round: RoundView;
  readonly part: PartView;
  readonly answer: Draft[string] | undefined;
  readonly onChange: (answer: Draft[string]) => void;
  readonly checked: boolean;
}

/** The field for one thing asked, by its kind. */
export function PartField({ round, part, answer, onChange, checked }: PartFieldProps) {
  if (part.kind === 'number') {
    const marked = round.attempts.at(-1)?.parts.find((one) => one.key === part.key);
    return (
      <NumberField
        label={part.label}
        field={part}
        value={typedOf(answer)}
        onChange={onChange}
        checked={checked}
        wrong={marked !== undefined && !marked.right}
      />
    );
  }
  if (part.kind === 'choice') {
    return (
      <ChoiceField
        part={part}
        chosen={chosenOf(answer)}
        onChange={(chosen) => onChange([...chosen])}
        checked={checked}
      />
    );
  }
  if (part.kind === 'design') {
    return (
      <DesignField
        part={part}
        answer={settingOf(answer)}
        onChange={(setting) => onChange({ ...setting })}
        checked={checked}
      />
    );
  }
  return (
    <SettingField
      part={part}
      figure={round.figure as BenchSpec}
      title={round.title}
      setting={settingOf(answer)}
      onChange={(setting) => onChange({ ...setting })}
      missing={checked && !isAnswered(part, answer)}
    />
  );
}
