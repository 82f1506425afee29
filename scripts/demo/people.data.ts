import type { Manner } from './manner';

/** The password of everybody in the demo data, which holds nothing worth keeping secret. */
export const demoPassword = 'tar and copper nails';

/** Everybody's address ends in a domain that is set apart for examples (RFC 2606). */
export const demoDomain = 'harbour.example';

/** Somebody of the demo workshop. */
export interface DemoPerson {
  readonly name: string;
  readonly units?: 'inch';
}

/** A learner of the demo workshop, with the way in which they go about it. */
export interface DemoLearner extends DemoPerson {
  readonly manner: Manner;
}

/** A class of the demo workshop, and what is set to it: how many days ago, due when. */
export interface DemoClass {
  readonly name: string;
  readonly instructors: readonly string[];
  readonly learners: readonly DemoLearner[];
  /** Who teaches another class and learns in this one. */
  readonly alsoLearns?: readonly string[];
  readonly set: readonly {
    readonly lessons: readonly string[];
    readonly exercises?: readonly string[];
    readonly daysAgo: number;
    readonly dueInDays: number;
    readonly note: string;
  }[];
}

/** The address under which somebody signs in: the first name at the harbour. */
export function demoAddress(name: string): string {
  const [first = ''] = name.split(' ');
  return `${first
    .normalize('NFD')
    .replace(/[^A-Za-z]/g, '')
    .toLowerCase()}@${demoDomain}`;
}

export const demoAdministrator: DemoPerson = { name: 'Ines Calder' };

export const demoInstructors: readonly DemoPerson[] = [
  { name: 'Marit Solheim' },
  { name: 'Tomás Arrieta' },
];

/** Builders of moving exhibits for the children's museum across the water. */
export const demoClasses: readonly DemoClass[] = [
  {
    name: 'Tuesday evening: figures that move',
    instructors: ['Marit Solheim'],
    alsoLearns: ['Tomás Arrieta'],
    learners: [
      { name: 'Agnes Pell', manner: 'quick' },
      { name: 'Bram Okafor', manner: 'steady' },
      { name: 'Catrin Hughes', manner: 'steady' },
      { name: 'Dario Benini', manner: 'guessing' },
      { name: 'Elif Aydin', manner: 'unsure' },
      { name: 'Fergus Lowry', manner: 'steady', units: 'inch' },
      { name: 'Gwen Tamm', manner: 'seldom' },
      { name: 'Hanno Vries', manner: 'quick' },
      { name: 'Ilse Marrow', manner: 'unsure' },
      { name: 'Jonah Reyes', manner: 'steady', units: 'inch' },
      { name: 'Kaisa Lind', manner: 'steady' },
    ],
    set: [
      {
        lessons: ['train-of-toothed-wheels'],
        daysAgo: 36,
        dueInDays: 7,
        note: 'For the lantern above the harbour door. Bring your tooth counts on Tuesday.',
      },
      {
        lessons: ['trammel-and-oval'],
        daysAgo: 22,
        dueInDays: 10,
        note: 'The oval frame for the whale. Try both pins before you answer.',
      },
      {
        lessons: ['pantograph'],
        daysAgo: 6,
        dueInDays: 10,
        note: 'We copy the lettering of the old ferry next week.',
      },
    ],
  },
  {
    name: 'Saturday morning: the lighthouse',
    instructors: ['Tomás Arrieta', 'Marit Solheim'],
    learners: [
      { name: 'Lorcan Daly', manner: 'steady' },
      { name: 'Mina Haddad', manner: 'quick' },
      { name: 'Nils Berg', manner: 'guessing' },
      { name: 'Oona Virtanen', manner: 'steady' },
      { name: 'Priya Raman', manner: 'quick', units: 'inch' },
      { name: 'Quentin Marsh', manner: 'unsure', units: 'inch' },
      { name: 'Rosa Lima', manner: 'steady' },
      { name: 'Sander Post', manner: 'seldom' },
      { name: 'Tilda Quist', manner: 'steady' },
      { name: 'Umar Farouk', manner: 'unsure' },
    ],
    set: [
      {
        lessons: ['train-of-toothed-wheels'],
        daysAgo: 29,
        dueInDays: 14,
        note: 'One turn of the crank, four of the light. Which wheels?',
      },
      {
        lessons: [],
        exercises: ['oval-from-pins', 'pins-for-an-oval', 'set-the-pins'],
        daysAgo: 13,
        dueInDays: 10,
        note: 'Only these three: the gallery rail is an oval.',
      },
      {
        lessons: ['pantograph'],
        daysAgo: 3,
        dueInDays: 12,
        note: 'The keeper’s name board, at three to two.',
      },
    ],
  },
  {
    name: 'Apprentices: the sign shop',
    instructors: ['Tomás Arrieta'],
    learners: [
      { name: 'Vera Novak', manner: 'quick' },
      { name: 'Wim Janssen', manner: 'steady' },
      { name: 'Xenia Petrou', manner: 'steady' },
      { name: 'Yusuf Demir', manner: 'unsure' },
      { name: 'Zora Kovač', manner: 'guessing' },
      { name: 'Anselm Burke', manner: 'seldom' },
      { name: 'Birgit Moe', manner: 'steady' },
      { name: 'Cillian Roe', manner: 'new' },
      { name: 'Dagny Holm', manner: 'steady' },
    ],
    set: [
      {
        lessons: ['pantograph'],
        daysAgo: 20,
        dueInDays: 14,
        note: 'Every sign we cut begins on this bench.',
      },
      {
        lessons: ['trammel-and-oval'],
        daysAgo: 8,
        dueInDays: 9,
        note: 'Oval shop signs: the size is given, you find the pins.',
      },
    ],
  },
];
