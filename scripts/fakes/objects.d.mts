export function startObjectStore(
  folder: string,
  options?: { wantedPort?: number },
): Promise<{ url: string; stop: () => Promise<unknown> }>;
