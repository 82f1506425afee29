import type { Locator, Page } from 'playwright-core';
import { exercises, lessons } from '@/content/exercises/registry';
import { shownOptions } from '@/lib/marking/mark-choice';
import type { DesignPart, Part, Setting, SettingPart, Variant } from '@/lib/marking/definition';
import { trueValues } from '@/lib/marking/values';
import { convert } from '@/lib/quantities/units';
import { write } from '@/lib/quantities/write';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import { modelOf } from '@/lib/scene/model-of';
import { openVariant } from './records';

export function lessonPath(lessonId: string): string {
  const lesson = lessons.find(({ id }) => id === lessonId);
  if (!lesson) throw new Error(`There is no lesson ${lessonId}.`);
  return `/lessons/${lesson.unit}/${lesson.id}`;
}

/** Makes sure that a round is open and gives its section of the page. */
export async function openExercise(page: Page, exerciseId: string): Promise<Locator> {
  const section = page.locator(`section#${exerciseId}`);
  const begin = section.getByRole('button', { name: /^(Start|New numbers)$/ });
  if ((await begin.count()) > 0) {
    await begin.first().click();
    await section.getByRole('button', { name: /^Check/ }).waitFor();
  }
  return section;
}

/** Answers the open round rightly, part by part, through the page. */
export async function answerRightly(section: Locator, email: string, exerciseId: string) {
  const variant = await openVariant(email, exerciseId);
  const definition = exercises.get(exerciseId);
  if (!definition) throw new Error(`There is no exercise ${exerciseId}.`);
  const earlier = trueValues(definition, variant);
  for (const part of definition.parts) {
    await answerPart(section, part, variant, (key) => {
      const value = earlier[key];
      if (value === undefined) throw new Error(`${exerciseId} has no value for ${key}.`);
      return value;
    });
  }
  await section.getByRole('button', { name: /^Check/ }).click();
}

async function answerPart(
  section: Locator,
  part: Part,
  variant: Variant,
  valueOf: (key: string) => number,
): Promise<void> {
  switch (part.kind) {
    case 'number': {
      const { unit, places } = part.field(variant.units);
      const typed = write(valueOf(part.key), unit, Math.max(places ?? 0, 4));
      await section.getByLabel(part.label(variant), { exact: true }).fill(typed);
      return;
    }
    case 'choice': {
      const wanted = part.answer(variant);
      for (const option of shownOptions(part, variant)) {
        if (!wanted.includes(option.option)) continue;
        await section
          .getByRole(part.multiple ? 'checkbox' : 'radio', { name: option.label, exact: true })
          .check();
      }
      return;
    }
    case 'setting':
      return setBench(section, part, variant);
    case 'design':
      return fillDesign(section, part, variant);
  }
}

/** Sets the bench's own controls, one after the other, by what their fields show. */
async function setBench(section: Locator, part: SettingPart, variant: Variant): Promise<void> {
  const definition = exercises.get(variant.exerciseId);
  let spec = definition?.figure?.(variant) as BenchSpec | undefined;
  if (!spec) throw new Error(`${variant.exerciseId} has no bench.`);
  for (const [key, value] of Object.entries(part.answer(variant))) {
    const model = modelOf(spec);
    const control = model.controls.find((candidate) => candidate.key === key);
    if (control?.kind === 'choice') {
      await section.getByLabel(control.label, { exact: true }).selectOption(String(value));
      spec = model.set(key, value);
    } else if (control?.kind === 'number') {
      const { unit, dimension } = control.field;
      const shown = dimension === 'length' ? convert(Number(value), 'mm', unit) : Number(value);
      const field = section.getByRole('spinbutton', { name: control.label, exact: true });
      await field.fill(dimension === 'length' ? write(shown, unit, 4) : String(shown));
      await field.press('Enter');
      spec = model.set(key, shown);
    } else {
      throw new Error(`The bench of ${variant.exerciseId} has no control ${key}.`);
    }
  }
}

async function fillDesign(section: Locator, part: DesignPart, variant: Variant): Promise<void> {
  const answer: Setting = part.answer(variant);
  for (const field of part.fields(variant)) {
    const value = answer[field.key];
    const control = section.getByLabel(field.label, { exact: true });
    if (field.kind === 'stock') await control.selectOption(String(value));
    else await control.fill(write(Number(value), field.field.unit, 4));
  }
}

/** What a round's setting wants of each of the bench's number controls, as their fields show it. */
export async function wantedOfBench(email: string, exerciseId: string) {
  const variant = await openVariant(email, exerciseId);
  const definition = exercises.get(exerciseId);
  const part = definition?.parts.find(({ kind }) => kind === 'setting');
  const spec = definition?.figure?.(variant) as BenchSpec | undefined;
  if (part?.kind !== 'setting' || !spec) throw new Error(`${exerciseId} sets no bench.`);
  const answer = part.answer(variant);
  return modelOf(spec).controls.flatMap((control) => {
    const value = answer[control.key];
    if (control.kind !== 'number' || value === undefined) return [];
    const { unit, dimension } = control.field;
    const shown = dimension === 'length' ? convert(Number(value), 'mm', unit) : Number(value);
    return [{ label: control.label, step: control.step, shown }];
  });
}

/** Brings a bench to what is wanted notch by notch, with whatever presses once. */
export async function setByNotches(
  section: Locator,
  wanted: Awaited<ReturnType<typeof wantedOfBench>>,
  press: (label: string, way: 'more' | 'less') => Promise<void>,
): Promise<void> {
  for (const { label, step, shown } of wanted) {
    const field = section.getByRole('spinbutton', { name: label, exact: true });
    for (let presses = 0; ; presses += 1) {
      const off = shown - Number(await field.getAttribute('aria-valuenow'));
      if (Math.abs(off) < step / 2) break;
      if (presses > 200) throw new Error(`${label} does not come to ${shown}.`);
      await press(label, off > 0 ? 'more' : 'less');
    }
  }
}
