import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { authOptions } from '@/lib/auth/options';
import { refuseForeignOrigin } from '../../_http/guard';

interface Context {
  params: Promise<{ nextauth: string[] }>;
}

async function handle(request: NextRequest, context: Context): Promise<Response> {
  const answer: unknown = await NextAuth(request, context, authOptions());
  if (!(answer instanceof Response)) throw new Error('next-auth did not answer');
  answer.headers.set('Cache-Control', 'no-store');
  return answer;
}

export function GET(request: NextRequest, context: Context): Promise<Response> {
  return handle(request, context);
}

/** Form posts with next-auth's own token; the origin is checked here before it sees them. */
export async function POST(request: NextRequest, context: Context): Promise<Response> {
  return refuseForeignOrigin(request) ?? handle(request, context);
}
