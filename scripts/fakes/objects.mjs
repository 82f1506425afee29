import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:http';
import path from 'node:path';
import { freePort } from '../machine/node.mjs';

/**
 * The few verbs of an S3 bucket that the application uses (put, get, head, delete), kept as files.
 * Loopback only; signatures are not checked.
 */
export async function startObjectStore(folder, { wantedPort = 9025 } = {}) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const port = await freePort(wantedPort);
  // A key becomes one file name, so that no key can reach outside the folder.
  const fileOf = (url) =>
    path.join(folder, createHash('sha256').update(new URL(url, 'http://x').pathname).digest('hex'));

  const server = createServer((request, response) => {
    const file = fileOf(request.url ?? '/');
    const answer = (status, headers = {}, body) => {
      response.writeHead(status, headers);
      response.end(body);
    };
    if (request.method === 'PUT') {
      const chunks = [];
      request.on('data', (chunk) => chunks.push(chunk));
      request.on('end', () => {
        const body = Buffer.concat(chunks);
        writeFileSync(file, body);
        writeFileSync(
          `${file}.type`,
          request.headers['content-type'] ?? 'application/octet-stream',
        );
        answer(200, { etag: `"${createHash('md5').update(body).digest('hex')}"` });
      });
    } else if (request.method === 'DELETE') {
      rmSync(file, { force: true });
      rmSync(`${file}.type`, { force: true });
      answer(204);
    } else if (!existsSync(file)) {
      answer(404, { 'content-type': 'application/xml' }, '<Error><Code>NoSuchKey</Code></Error>');
    } else {
      const headers = {
        'content-type': readFileSync(`${file}.type`, 'utf8'),
        'content-length': statSync(file).size,
      };
      answer(200, headers, request.method === 'HEAD' ? undefined : readFileSync(file));
    }
  });
  await new Promise((resolve) => server.listen(port, '127.0.0.1', resolve));
  return {
    url: `http://127.0.0.1:${port}`,
    stop: () =>
      new Promise((resolve) => {
        server.close(resolve);
        server.closeAllConnections();
      }),
  };
}
