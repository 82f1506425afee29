import 'server-only';
import { exercises } from './registry';

/**
 * Which section of its lesson helps with a skill when it did not come off: the rule, unless the hand
 * or the wood says it better.
 */
const sectionOfSkill: Readonly<Record<string, string>> = {
  'train.direction': 'try',
  'train.idler': 'try',
  'train.centres': 'wood',
  'trammel.slot-length': 'wood',
  'pantograph.reduction': 'try',
  'pantograph.reach': 'try',
};

/** A section of a lesson. */
export interface SectionToShow {
  readonly lessonId: string;
  readonly sectionId: string;
}

/**
 * The section to show again for a slip in a part of an exercise; null for an exercise that is not
 * there any more. `part` is the key as it stands in a marking: `part` or `part.criterion`.
 *
 * @example sectionToShow('grooves-and-bar', 'groove') // { lessonId: 'trammel-and-oval', sectionId: 'wood' }
 */
export function sectionToShow(exerciseId: string, part: string): SectionToShow | null {
  const definition = exercises.get(exerciseId);
  if (definition === undefined) return null;
  const [key = ''] = part.split('.');
  const skills = definition.parts.find((one) => one.key === key)?.skills ?? definition.skills;
  const section = skills.map((skill) => sectionOfSkill[skill]).find((one) => one !== undefined);
  return { lessonId: definition.lesson, sectionId: section ?? 'rule' };
}
