/** What is looked for, as the query of an address; what is not named stays out. */
export function queryOf(filter: Readonly<Record<string, string | undefined>>): string {
  return new URLSearchParams(
    Object.entries(filter).filter((entry): entry is [string, string] => Boolean(entry[1])),
  ).toString();
}
