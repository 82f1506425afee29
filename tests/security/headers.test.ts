import { pathToFileURL } from 'node:url';
import type { NextConfig } from 'next';
import { NextRequest } from 'next/server';
import { describe, expect, it } from 'vitest';
import { config, contentSecurityPolicy, proxy } from '@/proxy';

/** Plain JavaScript, which the compiler does not look into. */
const nextConfigFile = pathToFileURL('next.config.mjs').href;

function directives(policy: string): Map<string, string> {
  return new Map(
    policy.split('; ').map((one) => {
      const [name = '', ...values] = one.split(' ');
      return [name, values.join(' ')];
    }),
  );
}

describe('the policy of a document', () => {
  it('lets scripts run by nonce only, and closes the rest', () => {
    const policy = directives(contentSecurityPolicy('abc', false));
    expect(policy.get('default-src')).toBe("'none'");
    expect(policy.get('script-src')).toBe("'nonce-abc' 'strict-dynamic'");
    expect(policy.get('style-src')).toBe("'self' 'nonce-abc'");
    expect(policy.get('style-src-attr')).toBe("'unsafe-inline'");
    for (const closed of ['object-src', 'base-uri', 'frame-ancestors']) {
      expect(policy.get(closed)).toBe("'none'");
    }
    expect(contentSecurityPolicy('abc', false)).not.toContain('unsafe-eval');
  });

  it('has a nonce of its own each time, told to the page in the request', () => {
    const answers = [1, 2].map(() => proxy(new NextRequest('http://127.0.0.1:3000/today?tab=set')));
    const nonces = answers.map((answer) => {
      const policy = answer.headers.get('content-security-policy') ?? '';
      return /'nonce-([^']+)'/.exec(policy)?.[1];
    });
    expect(nonces[0]).toMatch(/^[A-Za-z0-9+/=]{20,}$/);
    expect(nonces[0]).not.toBe(nonces[1]);
    expect(answers[0]?.headers.get('x-middleware-request-x-nonce')).toBe(nonces[0]);
    expect(answers[0]?.headers.get('x-middleware-request-x-hornbeam-path')).toBe('/today?tab=set');
  });

  it('is not matched on /api or on files', () => {
    const source = config.matcher[0]?.source ?? '';
    const matches = (path: string) => new RegExp(`^${source}$`).test(path);
    expect(matches('/today')).toBe(true);
    expect(matches('/lessons/toothed-wheels/train-of-toothed-wheels')).toBe(true);
    expect(matches('/api/attempts')).toBe(false);
    expect(matches('/_next/static/chunks/main.js')).toBe(false);
  });
});

describe('every answer', () => {
  it('carries the usual headers', async () => {
    const { default: nextConfig } = (await import(nextConfigFile)) as { default: NextConfig };
    const [everywhere] = (await nextConfig.headers?.()) ?? [];
    const headers = new Map(everywhere?.headers.map(({ key, value }) => [key, value]));
    expect(everywhere?.source).toBe('/:path*');
    expect(headers.get('X-Content-Type-Options')).toBe('nosniff');
    expect(headers.get('X-Frame-Options')).toBe('DENY');
    expect(headers.get('Referrer-Policy')).toBe('same-origin');
    expect(headers.get('Strict-Transport-Security')).toMatch(/max-age=31536000/);
    expect(nextConfig.poweredByHeader).toBe(false);
  });
});
