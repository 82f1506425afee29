import 'server-only';
import { Logger } from 'graphile-worker';

/** Says what went wrong, in one line each; that all is well needs no saying. */
export const quietLogger = new Logger(() => (level, message) => {
  if (level !== 'error' && level !== 'warning') return;
  process.stderr.write(`[work] ${message.split('\n')[0] ?? ''}\n`);
});
