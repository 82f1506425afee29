/** That something was tried too often, and when to come back. */
export function waitSentence(seconds: number): string {
  const minutes = Math.ceil(seconds / 60);
  const wait = minutes < 2 ? 'a minute' : `${minutes} minutes`;
  return `That was tried too often. Wait ${wait}, then try again.`;
}
