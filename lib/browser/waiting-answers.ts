import { createStore, del, set, update, values, type UseStore } from 'idb-keyval';
import type { AttemptRequest, AttemptReply } from '@/lib/schemas/round';
import { isPassing, isSignedOut, NetworkAway, Problem, sentenceFor } from './problem';

/** An answer given while it could not be sent, as kept on this device. */
export interface WaitingAnswer {
  /** Also its Idempotency-Key: a UUID, made when the answer was given. */
  readonly key: string;
  readonly personId: string;
  readonly exerciseId: string;
  readonly title: string;
  readonly request: AttemptRequest;
  readonly givenAt: string;
  /** Why the server will not have it; it is not sent again. */
  readonly refused?: string;
}

/** What became of one answer when it was sent. */
export type Sent =
  | { readonly outcome: 'marked'; readonly answer: WaitingAnswer; readonly reply: AttemptReply }
  | { readonly outcome: 'refused'; readonly answer: WaitingAnswer; readonly sentence: string }
  | { readonly outcome: 'waiting'; readonly answer: WaitingAnswer; readonly error: unknown };

type Send = (request: AttemptRequest, idempotencyKey: string) => Promise<AttemptReply>;

let opened: UseStore | null = null;

function store(): UseStore {
  opened ??= createStore('hornbeam-waiting-answers', 'answers');
  return opened;
}

/** Keeps an answer on this device until it can be sent. */
export async function keepAnswer(answer: WaitingAnswer): Promise<void> {
  await set(answer.key, answer, store());
}

/** Throws a kept answer away; nothing happens when it is not there. */
export async function discardAnswer(key: string): Promise<void> {
  await del(key, store());
}

/** Every answer that waits on this device, whoever gave it, the oldest first. */
export async function listWaiting(): Promise<readonly WaitingAnswer[]> {
  const answers = await values<WaitingAnswer>(store());
  return answers.sort((one, other) => one.givenAt.localeCompare(other.givenAt));
}

/**
 * How many answers of this person still wait on this device, refused ones left out. Signing out
 * asks this first.
 */
export async function waitingCount(personId: string): Promise<number> {
  const answers = await listWaiting();
  return answers.filter((answer) => answer.personId === personId && !answer.refused).length;
}

/**
 * Sends the answers of this person, one after the other, and forgets each as soon as it is marked.
 *
 * Answers of anybody else stay as they are. Sending stops when the network is away or the
 * session has ended; an answer that the server refuses for good is kept with its reason.
 * Several tabs take turns, and the key of each answer makes a second delivery harmless.
 */
export async function sendWaiting(personId: string, send: Send): Promise<readonly Sent[]> {
  return inTurn(async () => {
    const sent: Sent[] = [];
    for (const answer of await listWaiting()) {
      if (answer.personId !== personId || answer.refused !== undefined) continue;
      const one = await sendOne(answer, send);
      sent.push(one);
      if (one.outcome === 'waiting' && stopsAll(one.error)) break;
    }
    return sent;
  });
}

function stopsAll(error: unknown): boolean {
  return error instanceof NetworkAway || isSignedOut(error);
}

async function sendOne(answer: WaitingAnswer, send: Send): Promise<Sent> {
  try {
    const reply = await send(answer.request, answer.key);
    await discardAnswer(answer.key);
    return { outcome: 'marked', answer, reply };
  } catch (error) {
    if (isPassing(error) || mayBeSomebodyElse(error)) {
      return { outcome: 'waiting', answer, error };
    }
    const sentence = sentenceFor(error);
    await update<WaitingAnswer>(
      answer.key,
      (kept) => ({ ...(kept ?? answer), refused: sentence }),
      store(),
    );
    return { outcome: 'refused', answer, sentence };
  }
}

/**
 * A round that is not there may only mean that somebody else has signed in from another tab since
 * this page was opened, so the answer is not thrown away for it.
 */
function mayBeSomebodyElse(error: unknown): boolean {
  return error instanceof Problem && [401, 403, 404].includes(error.status);
}

let last: Promise<unknown> = Promise.resolve();

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (typeof navigator !== 'undefined' && 'locks' in navigator) {
    return navigator.locks.request('hornbeam-waiting-answers', work);
  }
  const mine = last.then(work, work);
  last = mine.catch(() => undefined);
  return mine;
}
