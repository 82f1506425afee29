import { createTransport } from 'nodemailer';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { catchMail, type CaughtMail } from '../support/postbox';

let caught: CaughtMail;
beforeAll(async () => {
  caught = await catchMail();
  const transport = createTransport({ url: caught.url });
  await transport.sendMail({
    from: 'Hornbeam <hornbeam@localhost>',
    to: 'ida@harbour.example',
    subject: 'Come <b>in</b>',
    messageId: '<one@harbour.example>',
    text: 'Follow http://127.0.0.1:3000/set-password/token <now>',
    html: '<html><head></head><body><script>alert(1)</script><p>Follow it</p></body></html>',
  });
  transport.close();
});
afterAll(() => caught.close());

async function get(path: string) {
  const answer = await fetch(new URL(path, caught.page));
  return { status: answer.status, headers: answer.headers, body: await answer.text() };
}

async function letterPath(): Promise<string> {
  const { body } = await get('/');
  return /href="(\/[^"]+\.eml)"/.exec(body)?.[1] ?? '';
}

describe('the page of the mail that was caught', () => {
  it('lists what came, and lets nobody’s words be tags', async () => {
    const { status, body, headers } = await get('/');
    expect(status).toBe(200);
    expect(body).toContain('ida@harbour.example');
    expect(body).toContain('Come &#60;b&#62;in&#60;/b&#62;');
    expect(headers.get('cache-control')).toBe('no-store');
  });

  it('shows a letter as text with its links, its headers, and its HTML in a closed frame', async () => {
    const { body, headers } = await get(await letterPath());
    expect(body).toContain(
      '<a href="http://127.0.0.1:3000/set-password/token">http://127.0.0.1:3000/set-password/token</a> &#60;now&#62;',
    );
    expect(body).toContain('&#60;one@harbour.example&#62;');
    expect(body).toContain(
      'sandbox="allow-popups allow-popups-to-escape-sandbox" srcdoc="&#60;html&#62;&#60;head&#62;&#60;base ',
    );
    expect(body).not.toContain('<script');
    expect(headers.get('content-security-policy')).toContain("default-src 'none'");
  });

  it('has nothing but the letters', async () => {
    for (const path of ['/no.eml', '/..%2f..%2fpackage.json', `${await letterPath()}/raw`]) {
      expect((await get(path)).status).toBe(404);
    }
  });
});
