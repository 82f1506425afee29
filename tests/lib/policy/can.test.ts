import { describe, expect, it } from 'vitest';
import { can, rights, type Action } from '@/lib/policy/can';
import { isLearner, isStaff, type Membership, type Viewer } from '@/lib/policy/viewer';

function viewer(memberships: Membership[], isAdministrator = false): Viewer {
  return {
    personId: 'p',
    learnerId: 'l',
    name: 'Somebody',
    isAdministrator,
    units: 'metric',
    timeZone: 'Europe/London',
    reducedMotion: false,
    sessionId: 's',
    memberships,
  };
}

const people = {
  nobody: null,
  alone: viewer([]),
  learner: viewer([{ classId: 'here', role: 'learner' }]),
  'learner elsewhere': viewer([{ classId: 'there', role: 'learner' }]),
  instructor: viewer([{ classId: 'here', role: 'instructor' }]),
  'instructor elsewhere': viewer([{ classId: 'there', role: 'instructor' }]),
  'teaches there, learns here': viewer([
    { classId: 'there', role: 'instructor' },
    { classId: 'here', role: 'learner' },
  ]),
  administrator: viewer([], true),
};

/** Who may do what with the class `here`; whoever is not named may not. */
const everybody = Object.keys(people).slice(1) as (keyof typeof people)[];
const staff: (keyof typeof people)[] = ['instructor', 'administrator'];
const expected: Record<Action, (keyof typeof people)[]> = {
  'answer exercises': everybody,
  'see their own progress': everybody,
  'change their own account': everybody,
  'take away their own records': everybody,
  'join a class by its word': everybody,
  'see answers and slips': [
    'instructor',
    'instructor elsewhere',
    'teaches there, learns here',
    'administrator',
  ],
  'see a class': ['learner', 'instructor', 'teaches there, learns here', 'administrator'],
  'see who is in a class': staff,
  'see the progress of a class': staff,
  'see where a class is stuck': staff,
  'take away the progress of a class': staff,
  "see a learner's attempts": staff,
  "comment on a learner's work": staff,
  'override a marking': staff,
  'set work for a class': staff,
  'give a learner more time': staff,
  'make a class': ['administrator'],
  'change a class': staff,
  'change who is in a class': ['administrator'],
  'take somebody out of a class': staff,
  'invite people to a class': staff,
  'invite an instructor to a class': ['administrator'],
  'open a class to its joining word': staff,
  'invite people to the workshop': ['administrator'],
  'look after people': ['administrator'],
  'make somebody an administrator': ['administrator'],
  'see what was mailed': ['administrator'],
  'read the audit log': ['administrator'],
};

describe('rights', () => {
  it.each(Object.keys(rights) as Action[])('say who may %s', (action) => {
    const allowed = Object.entries(people)
      .filter(([, who]) => can(who, action, 'here'))
      .map(([name]) => name);
    expect(allowed).toEqual(expected[action]);
  });

  it('in a class need the class to be named', () => {
    expect(can(people.instructor, 'set work for a class')).toBe(false);
  });
});

describe('a viewer', () => {
  it('learns in a class, or for themselves when they are in none', () => {
    expect(isLearner(people.alone)).toBe(true);
    expect(isLearner(people['teaches there, learns here'])).toBe(true);
    expect(isLearner(people.instructor)).toBe(false);
    expect(isStaff(people['teaches there, learns here'])).toBe(true);
    expect(isStaff(people.learner)).toBe(false);
  });
});
