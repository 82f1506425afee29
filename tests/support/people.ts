import {
  demoAddress,
  demoAdministrator,
  demoClasses,
  demoInstructors,
  demoPassword,
} from '../../scripts/demo/people.data';

/** Who the end-to-end tests sign in as: people of the demo workshop. */
const [tuesday] = demoClasses;
const [, second] = tuesday?.learners ?? [];
if (!tuesday) throw new Error('The demo workshop has no class.');
const [firstLearner] = tuesday.learners;
const [instructor] = tuesday.instructors;
const other = demoInstructors.find(({ name }) => !tuesday.instructors.includes(name));
if (!firstLearner || !second || !instructor || !other)
  throw new Error('The first class of the demo is empty.');

export const password = demoPassword;
export const demo = {
  administrator: demoAddress(demoAdministrator.name),
  instructor: demoAddress(instructor),
  otherInstructor: demoAddress(other.name),
  learner: demoAddress(firstLearner.name),
  secondLearner: demoAddress(second.name),
  className: tuesday.name,
} as const;
