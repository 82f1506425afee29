import { mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:http';
import path from 'node:path';
import { freePort } from '../machine/node.mjs';

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
  const page = await startPage(folder, await freePort(pagePort));
  return {
    url: `smtp://127.0.0.1:${port}`,
    page: page.url,
    stop: async () => {
      await new Promise((resolve) => smtp.close(resolve));
      await page.stop();
    },
  };
}

const escape = (text) => text.replace(/[&<>"']/g, (mark) => `&#${mark.charCodeAt(0)};`);

const document = (title, body) =>
  `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>${escape(title)}</title><style>:root{color-scheme:light dark}body{font:17px/1.6 system-ui,sans-serif;max-width:68ch;margin:2rem auto;padding:0 1rem}
pre{white-space:pre-wrap;overflow-wrap:anywhere}td,th{text-align:left;padding:.25rem 1rem .25rem 0;vertical-align:top}</style>
<h1>${escape(title)}</h1>${body}</html>`;

async function startPage(folder, port) {
  const { simpleParser } = await import('mailparser');
  const names = () =>
    readdirSync(folder)
      .filter((name) => name.endsWith('.eml'))
      .sort()
      .reverse();
  const read = (name) => simpleParser(readFileSync(path.join(folder, name)));

  async function list() {
    const rows = await Promise.all(
      names()
        .slice(0, 100)
        .map(async (name) => {
          const mail = await read(name);
          return `<tr><td>${escape(mail.date?.toISOString().slice(0, 16) ?? '')}<td>${escape(mail.to?.text ?? '')}<td><a href="/${encodeURIComponent(name)}">${escape(mail.subject ?? '(no subject)')}</a>`;
        }),
    );
    const table = `<table><tr><th>When<th>To<th>Subject${rows.join('')}</table>`;
    return document('Mail caught here', rows.length > 0 ? table : '<p>Nothing yet.');
  }

  async function show(name) {
    const mail = await read(name);
    const text = escape(mail.text ?? '').replace(
      /https?:\/\/[^\s<]+/g,
      (url) => `<a href="${url}">${url}</a>`,
    );
    return document(
      mail.subject ?? '(no subject)',
      `<p>To ${escape(mail.to?.text ?? '')}<p><a href="/">All mail</a><pre>${text}</pre>`,
    );
  }

  const server = createServer(async (request, response) => {
    const name = decodeURIComponent((request.url ?? '/').slice(1));
    const known = name === '' || names().includes(name);
    const body = known
      ? await (name === '' ? list() : show(name))
      : document('Not here', '<p><a href="/">All mail</a>');
    response.writeHead(known ? 200 : 404, {
      'content-type': 'text/html; charset=utf-8',
      'content-security-policy': "default-src 'none'; style-src 'unsafe-inline'",
      'cache-control': 'no-store',
    });
    response.end(body);
  });
  await new Promise((resolve) => server.listen(port, '127.0.0.1', resolve));
  return {
    url: `http://127.0.0.1:${port}/`,
    stop: () =>
      new Promise((resolve) => {
        server.close(resolve);
        server.closeAllConnections();
      }),
  };
}
