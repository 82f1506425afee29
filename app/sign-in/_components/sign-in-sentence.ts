/** What to say when signing in did not work: never whether the address is known. */
export function sentenceForSignIn(error: string | null | undefined): string {
  if (error === 'network') {
    return 'The network is away just now. What you typed is still here: try again in a moment.';
  }
  if (error?.startsWith('throttled')) {
    return 'That was tried too often. Wait a quarter of an hour, then try again.';
  }
  return 'That address and password do not fit together. Look at both and try again.';
}
