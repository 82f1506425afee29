import { describe, expect, it } from 'vitest';
import { homeOf, isCurrent, linksFor, type NavigationViewer } from '@/app/_components/navigation';

const person = (
  roles: readonly ('learner' | 'instructor')[],
  isAdministrator = false,
): NavigationViewer => ({ isAdministrator, memberships: roles.map((role) => ({ role })) });

const labels = (viewer: NavigationViewer | null) => linksFor(viewer).map((link) => link.label);

describe('the navigation', () => {
  it('shows visitors what they can use without an account', () => {
    expect(labels(null)).toEqual(['Lessons', 'By motion', 'For instructors']);
  });

  it('follows what somebody does here', () => {
    expect(labels(person(['learner']))).toEqual(['Today', 'Lessons', 'By motion']);
    expect(labels(person(['instructor']))).toEqual(['Classes', 'Lessons', 'By motion']);
    expect(labels(person(['instructor', 'learner']))).toEqual([
      'Today',
      'Classes',
      'Lessons',
      'By motion',
    ]);
    expect(labels(person([], true))).toEqual([
      'People',
      'Classes',
      'Mail',
      'Audit log',
      'Lessons',
      'By motion',
    ]);
  });

  it('treats somebody in no class as a learner', () => {
    expect(labels(person([]))).toEqual(['Today', 'Lessons', 'By motion']);
  });

  it('leads home to Today, to the classes, or to the people', () => {
    expect(homeOf(person(['instructor', 'learner']))).toBe('/today');
    expect(homeOf(person(['instructor']))).toBe('/classes');
    expect(homeOf(person([], true))).toBe('/people');
  });

  it('marks a link for its own page and the pages under it only', () => {
    expect(isCurrent('/lessons', '/lessons/toothed-wheels/x')).toBe(true);
    expect(isCurrent('/lessons', '/lessons')).toBe(true);
    expect(isCurrent('/people', '/people-else')).toBe(false);
  });
});
