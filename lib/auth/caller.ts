import 'server-only';
import { headers } from 'next/headers';
import { siteEnvironment } from '@/lib/env';

/**
 * The network address of whoever calls, out of what the trusted proxies wrote; null when there is
 * no proxy to be trusted, because the header then says whatever the caller likes.
 */
export function callerAddress(forwardedFor: string | null | undefined): string | null {
  const { trustedProxies } = siteEnvironment();
  if (trustedProxies === 0 || !forwardedFor) return null;
  return (
    forwardedFor
      .split(',')
      .map((part) => part.trim())
      .at(-trustedProxies) ?? null
  );
}

/** The same for the request that is being answered. */
export async function currentCaller(): Promise<string | null> {
  return callerAddress((await headers()).get('x-forwarded-for'));
}

/** What the browser of the request that is being answered says of itself. */
export async function currentDevice(): Promise<string> {
  return (await headers()).get('user-agent') ?? '';
}
