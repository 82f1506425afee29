import 'server-only';
import { isTimeZone } from '@/lib/clock';
import { row } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';

/** What somebody has said of themselves, and how they like things shown. */
export interface Profile {
  readonly name: string;
  readonly email: string | null;
  readonly units: 'metric' | 'inch';
  readonly paper: 'a4' | 'a3' | 'letter' | 'tabloid';
  readonly timeZone: string;
  readonly reducedMotion: boolean;
}

/** The viewer's own profile; null when the account has gone meanwhile. */
export function findProfile(viewer: Viewer): Promise<Profile | null> {
  return row<Profile>(
    `select name, email, units, paper, time_zone as "timeZone", reduced_motion as "reducedMotion"
     from people where id = $1`,
    [viewer.personId],
  );
}

/** Changes what is named of the viewer's own profile. Throws `RangeError` for an unknown time zone. */
export async function updateProfile(
  viewer: Viewer,
  wanted: Partial<Omit<Profile, 'email'>>,
): Promise<void> {
  if (wanted.timeZone !== undefined && !isTimeZone(wanted.timeZone)) {
    throw new RangeError(`updateProfile: ${wanted.timeZone} is not a time zone`);
  }
  const { name, units, paper, timeZone, reducedMotion } = wanted;
  await models().Person.update(
    { name, units, paper, timeZone, reducedMotion },
    { where: { id: viewer.personId } },
  );
}
