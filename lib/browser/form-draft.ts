'use client';

/**
 * What a form sent, kept in this tab until its answer is here: when the session has ended meanwhile,
 * it stands in the form again after signing in. Passwords and files are never kept.
 */

const again = 'hornbeam-signed-in-again';

/** The key of one form of this page. */
export function draftKey(name: string): string {
  return `hornbeam-form-${window.location.pathname}#${name}`;
}

/** Keeps what a form is about to send. */
export function keepFormDraft(key: string, data: FormData): void {
  const values = [...data.entries()].filter(
    ([name, value]) =>
      typeof value === 'string' && !name.startsWith('$ACTION') && !/password|token/i.test(name),
  );
  inStorage((storage) => {
    storage.setItem(key, JSON.stringify(Object.fromEntries(values)));
  });
}

/** Forgets it: the answer is here. */
export function forgetFormDraft(key: string): void {
  inStorage((storage) => {
    storage.removeItem(key);
  });
}

/** Notes that somebody has just signed in to go on at `path`. */
export function noteSignedInAgain(path: string): void {
  inStorage((storage) => {
    storage.setItem(again, path.split('?')[0] ?? path);
  });
}

/** What the form had sent when the session was found to have ended, once; otherwise null. */
export function takeFormDraft(key: string): Readonly<Record<string, string>> | null {
  return inStorage((storage) => {
    if (storage.getItem(again) !== window.location.pathname) return null;
    const kept = storage.getItem(key);
    storage.removeItem(key);
    return kept === null ? null : (JSON.parse(kept) as Record<string, string>);
  });
}

/** Where nothing can be stored, nothing is kept and nothing is said. */
function inStorage<Result>(work: (storage: Storage) => Result): Result | null {
  try {
    return work(window.sessionStorage);
  } catch {
    return null;
  }
}
