export function startMailCatcher(
  folder: string,
  options?: { smtpPort?: number; pagePort?: number },
): Promise<{ url: string; page: string; stop: () => Promise<void> }>;
