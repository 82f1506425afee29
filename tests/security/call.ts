import type { BuiltAction } from './built';
import type { ActionOutcome, ActionRow, PageOutcome } from './endpoint';
import type { Planted } from './planted';

/** The ways of asking for a page: what one gets never depends on how one asks. */
export const ways = {
  plainly: {},
  'as a router’s request': { RSC: '1' },
  'as a prefetch': { RSC: '1', 'Next-Router-Prefetch': '1' },
  'as a browser’s prefetch': { Purpose: 'prefetch', 'Sec-Purpose': 'prefetch' },
} as const;

/** An answer with its body read. */
export interface Answer {
  readonly status: number;
  readonly headers: Headers;
  readonly body: string;
}

/** Asks once, following nothing but the framework's own step to an address with its mark. */
export async function ask(address: string, init: RequestInit = {}): Promise<Answer> {
  const response = await fetch(address, { redirect: 'manual', ...init });
  const onward = response.headers.get('location');
  if (onward?.includes('_rsc') === true) return ask(new URL(onward, address).href, init);
  return { status: response.status, headers: response.headers, body: await response.text() };
}

/**
 * What asking for a page came to. Where the head was sent before the page knew, the framework says
 * in the body what it would have said in the status.
 */
export function outcomeOfPage({ status, headers, body }: Answer): PageOutcome {
  const target = headers.get('location') ?? /NEXT_REDIRECT;\w+;([^;]*);/.exec(body)?.[1];
  if (target !== undefined) return isSignIn(target) ? 'sign in' : 'sent on';
  const told = /NEXT_HTTP_ERROR_FALLBACK;(\d+)/.exec(body)?.[1];
  switch (told === undefined ? status : Number(told)) {
    case 200:
      return 'shown';
    case 403:
      return 'forbidden';
    case 404:
      return 'missing';
    default:
      throw new Error(`A page answered ${status}: ${body.slice(0, 300)}`);
  }
}

/** Calls a server action by its id, as the framework's own client encodes it. */
export async function callAction(
  address: string,
  planted: Planted,
  { row, built, headers }: ActionCall,
): Promise<Answer> {
  const bound = (await row.bound?.(planted)) ?? [];
  return ask(`${address}${row.on(planted)}`, {
    method: 'POST',
    headers: { 'Next-Action': built.id, Accept: 'text/x-component', ...headers },
    body: encodeArguments(bound, row.form?.(planted) ?? null),
  });
}

export interface ActionCall {
  readonly row: ActionRow;
  readonly built: BuiltAction;
  readonly headers: Readonly<Record<string, string>>;
}

/** React's encoding of (…bound, state, form): the form's fields are parts of their own. */
function encodeArguments(
  bound: readonly unknown[],
  form: Readonly<Record<string, string>> | null,
): FormData {
  const encoded = new FormData();
  for (const [name, value] of Object.entries(form ?? {})) encoded.append(`_1_${name}`, value);
  const rest = form === null ? [] : [{ outcome: 'idle' }, '$K1'];
  encoded.append('0', JSON.stringify([...bound, ...rest]));
  return encoded;
}

/** What calling a server action came to. */
export function outcomeOfAction({ status, headers, body }: Answer): ActionOutcome {
  const target = headers.get('x-action-redirect');
  if (target !== null) return isSignIn(target) ? 'sign in' : 'sent on';
  if (status !== 200) throw new Error(`An action answered ${status}: ${body.slice(0, 300)}`);
  return /"outcome":"refused"/.test(body) ? 'refused' : 'done';
}

function isSignIn(target: string): boolean {
  return /^(https?:\/\/[^/]+)?\/sign-in(?=$|[?;])/.test(target);
}
