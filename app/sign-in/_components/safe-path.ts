/**
 * The path to go on to after signing in, if it lies on this site, else null. Anything that a
 * browser could read as another site (`//…`, `/\…`, a scheme, a control character) is refused.
 *
 * @example safePath('/today?x=1') // '/today?x=1'
 * @example safePath('//elsewhere.example') // null
 */
export function safePath(from: unknown): string | null {
  if (typeof from !== 'string' || from.length > 500) return null;
  if (!/^\/(?![/\\])/.test(from)) return null;
  if (/[\u0000-\u001f\\]/.test(from)) return null;
  if (from === '/sign-in' || from.startsWith('/sign-in?') || from.startsWith('/api/')) return null;
  return from;
}
