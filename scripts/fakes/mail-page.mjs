import { readdirSync, readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import path from 'node:path';

/** How many letters the list shows, the latest first. */
const listed = 200;

/** Shows the mail that lies in a folder: a list, and each letter as text, as HTML and with its headers. */
export async function startMailPage(folder, port) {
  const server = createServer((request, response) => {
    answer(folder, new URL(request.url ?? '/', 'http://127.0.0.1'))
      .catch((error) => page(500, 'This letter cannot be read', `<p>${escape(String(error))}`))
      .then(({ status, body }) => {
        response.writeHead(status, {
          'content-type': 'text/html; charset=utf-8',
          'content-security-policy':
            "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'",
          'referrer-policy': 'no-referrer',
          'cache-control': 'no-store',
        });
        response.end(body);
      });
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

async function answer(folder, url) {
  if (url.pathname === '/') return page(200, 'Mail caught here', await list(folder));
  const name = decodeURIComponent(url.pathname.slice(1));
  // Only what the folder lists is read: no name leads out of it.
  if (!names(folder).includes(name)) {
    return page(404, 'Not here', '<p><a href="/">All mail</a>');
  }
  const mail = await read(folder, name);
  return page(200, mail.subject ?? '(no subject)', letter(mail));
}

const names = (folder) =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.eml'))
    .sort()
    .reverse();

async function read(folder, name) {
  const { simpleParser } = await import('mailparser');
  return simpleParser(readFileSync(path.join(folder, name)));
}

async function list(folder) {
  const all = names(folder);
  if (all.length === 0) return '<p>Nothing yet.';
  const rows = [];
  for (const name of all.slice(0, listed)) {
    const mail = await read(folder, name);
    rows.push(
      `<tr><td>${escape(whenOf(mail))}<td>${escape(mail.to?.text ?? '')}<td><a href="/${encodeURIComponent(name)}">${escape(mail.subject ?? '(no subject)')}</a>`,
    );
  }
  const more = all.length > listed ? `<p>and ${all.length - listed} before these` : '';
  return `<div><table><caption>The latest first</caption><tr><th scope=col>When (UTC)<th scope=col>To<th scope=col>Subject${rows.join('')}</table></div>${more}`;
}

const whenOf = (mail) => mail.date?.toISOString().slice(0, 16).replace('T', ' ') ?? '';

/** The HTML stands in a frame where it runs and fetches nothing, and its links open by themselves. */
function letter(mail) {
  const facts = [
    ['To', mail.to?.text ?? ''],
    ['From', mail.from?.text ?? ''],
    ['Date', whenOf(mail)],
    ['Message-ID', mail.messageId ?? ''],
  ].map(([term, value]) => `<tr><th scope=row>${term}<td>${escape(value)}`);
  const text = escape(mail.text ?? '').replace(
    /https?:\/\/[^\s<]+/g,
    (address) => `<a href="${address}">${address}</a>`,
  );
  const html = mail.html
    ? `<h2>As HTML</h2><iframe title="The letter as HTML" sandbox="allow-popups allow-popups-to-escape-sandbox" srcdoc="${escape(mail.html.replace(/<head>/i, '<head><base target="_blank">'))}"></iframe>`
    : '';
  return `<p><a href="/">All mail</a><table>${facts.join('')}</table><h2>As text</h2><pre>${text}</pre>${html}`;
}

function page(status, title, body) {
  return {
    status,
    body: `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>${escape(title)}</title><style>
:root{color-scheme:light dark;--paper:#fbfaf5;--ink:#20251f;--pencil:#59604f;--rule:#cfc6b4;--chalk:#1f5c8f;--board:#f1ece1}
@media(prefers-color-scheme:dark){:root{--paper:#161a17;--ink:#eceadf;--pencil:#a9b0a0;--rule:#3b443b;--chalk:#8dc0ea;--board:#1f2520}}
body{font:17px/1.6 Verdana,system-ui,sans-serif;max-width:60rem;margin:2rem auto;padding:0 1rem;background:var(--paper);color:var(--ink)}
a{color:var(--chalk)}div{overflow-x:auto}table{border-collapse:collapse}caption{text-align:left;color:var(--pencil)}
td,th{text-align:left;padding:.4rem 1.5rem .4rem 0;vertical-align:top;border-bottom:1px solid var(--rule);overflow-wrap:anywhere}
th{font-weight:400;color:var(--pencil);white-space:nowrap}pre,iframe{background:var(--board);border:1px solid var(--rule);padding:1rem}
pre{white-space:pre-wrap;overflow-wrap:anywhere}iframe{width:100%;height:44rem;padding:0;box-sizing:border-box;background:#fbfaf5;color-scheme:light}
</style></head><body><h1>${escape(title)}</h1>${body}</body></html>`,
  };
}

function escape(text) {
  return text.replace(/[&<>"']/g, (mark) => `&#${mark.charCodeAt(0)};`);
}
