import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { freePort } from '../machine/node.mjs';
import { startMailPage } from './mail-page.mjs';

/**
 * A mail server that sends nothing on: it keeps each message as a file and shows them on a page.
 * Loopback only; for trying out and for tests.
 */
export async function startMailCatcher(folder, { smtpPort = 1025, pagePort = 8025 } = {}) {
  const { SMTPServer } = await import('smtp-server');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const port = await freePort(smtpPort);
  let count = 0;
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onData(stream, session, done) {
      const chunks = [];
      stream.on('data', (chunk) => chunks.push(chunk));
      stream.on('end', () => {
        count += 1;
        const name = `${new Date().toISOString().replaceAll(':', '-')}-${String(count).padStart(4, '0')}.eml`;
        writeFileSync(path.join(folder, name), Buffer.concat(chunks), { mode: 0o600 });
        done();
      });
    },
  });
  await new Promise((resolve, reject) => {
    smtp.once('error', reject);
    smtp.listen(port, '127.0.0.1', resolve);
  });
  const page = await startMailPage(folder, await freePort(pagePort));
  return {
    url: `smtp://127.0.0.1:${port}`,
    page: page.url,
    stop: async () => {
      await new Promise((resolve) => smtp.close(resolve));
      await page.stop();
    },
  };
}
