import type { Problem } from '@/lib/schemas/problem';

const titles: Readonly<Record<number, string>> = {
  400: 'The request cannot be read',
  401: 'Nobody is signed in',
  403: 'Not allowed from there',
  404: 'Not found',
  409: 'It has changed meanwhile',
  413: 'Too large',
  415: 'Not JSON',
  422: 'The request does not fit',
  429: 'Too often',
  500: 'Something went wrong',
  503: 'Not ready',
};

/** Headers of every answer under /api: nothing is kept, sniffed, framed or run. */
export const privateHeaders = {
  'Cache-Control': 'no-store',
  'Content-Security-Policy': "default-src 'none'; frame-ancestors 'none'",
  'X-Content-Type-Options': 'nosniff',
} as const;

/** An error as `application/problem+json`. */
export function problem(
  status: number,
  detail?: string,
  more: Omit<Partial<Problem>, 'status'> & { readonly headers?: Record<string, string> } = {},
): Response {
  const { headers, ...rest } = more;
  const body = {
    type: 'about:blank',
    title: titles[status] ?? 'Something went wrong',
    status,
    detail,
    ...rest,
  };
  return new Response(JSON.stringify(body), {
    status,
    headers: { ...privateHeaders, 'Content-Type': 'application/problem+json', ...headers },
  });
}

/** An answer as JSON. */
export function json(body: unknown, status = 200): Response {
  return new Response(JSON.stringify(body), {
    status,
    headers: { ...privateHeaders, 'Content-Type': 'application/json' },
  });
}

/** A file to be kept; it is never shown in place. */
export function download(content: string, name: string, type: string): Response {
  return new Response(content, {
    headers: {
      ...privateHeaders,
      'Content-Type': `${type}; charset=utf-8`,
      'Content-Disposition': `attachment; filename="${name}"`,
    },
  });
}
