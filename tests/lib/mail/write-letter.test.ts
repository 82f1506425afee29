// @vitest-environment jsdom
import { describe, expect, it } from 'vitest';
import { isEssential, letterKinds, letterSchema } from '@/lib/mail/letter';
import { writeLetter } from '@/lib/mail/write-letter';
import { sampleContext, sampleLetters } from './letters';

const essential = { ...sampleContext, unsubscribeAddress: null };

function written(letter: (typeof sampleLetters)[number]) {
  return writeLetter(letter, isEssential(letter.kind) ? essential : sampleContext);
}

/** The text as one line, without the marks of its lists and quotes. */
function flat(text: string): string {
  return text
    .replace(/^[>-] /gm, '')
    .replace(/\s+/g, ' ')
    .toLowerCase();
}

describe('letters', () => {
  it('are sampled in every kind', () => {
    expect(sampleLetters.map(({ kind }) => kind)).toEqual(letterKinds);
    for (const letter of sampleLetters) expect(letterSchema.parse(letter)).toEqual(letter);
  });

  it.each(sampleLetters)('of the kind $kind read as their golden file', async (letter) => {
    const { subject, text, html } = written(letter);
    await expect(`Subject: ${subject}\n\n${text}`).toMatchFileSnapshot(`golden/${letter.kind}.txt`);
    await expect(html).toMatchFileSnapshot(`golden/${letter.kind}.html`);
  });

  it.each(sampleLetters)('of the kind $kind say the same in text and in HTML', (letter) => {
    const { text, html } = written(letter);
    const document = new DOMParser().parseFromString(html, 'text/html');
    for (const leaf of document.querySelectorAll('body p, h2, li, th, td')) {
      expect(flat(text)).toContain(flat(leaf.textContent ?? '').trim());
    }
    for (const link of document.querySelectorAll('a')) {
      expect(text).toContain(link.getAttribute('href'));
    }
  });

  it.each(sampleLetters)('of the kind $kind are a document a screen reader can read', (letter) => {
    const { subject, html } = written(letter);
    const document = new DOMParser().parseFromString(html, 'text/html');
    expect(document.documentElement.lang).toBe('en-GB');
    expect(document.title).toBe(subject);
    expect(document.querySelectorAll('script, img, link, style, form')).toHaveLength(0);
    for (const link of document.querySelectorAll('a')) expect(link.textContent).not.toBe('');
  });

  it('can be ended where they are not essential, and only there', () => {
    for (const letter of sampleLetters) {
      const ended = /No more letters about your classes/;
      if (isEssential(letter.kind)) expect(written(letter).text).not.toMatch(ended);
      else expect(written(letter).text).toMatch(ended);
    }
  });

  it('let nobody’s words begin a header, a line of their own, or a tag', () => {
    for (const letter of sampleLetters) {
      if (!('className' in letter)) continue;
      const className = 'A\r\nBcc: x@y.example\r\n\r\n\u2028\u202e<script>alert(1)</script>';
      const { subject, text, html } = writeLetter({ ...letter, className }, sampleContext);
      expect(subject).not.toMatch(/[\p{Cc}\u2028\u202e]/u);
      expect(text).not.toMatch(/^bcc:/im);
      expect(html).not.toContain('<script');
    }
    const readerName = 'Ida\nSubject: changed';
    const { text } = writeLetter({ kind: 'address-changed' }, { ...essential, readerName });
    expect(text.split('\n')[0]).toBe('Hello Ida Subject: changed,');
  });

  it('with a link refuse to be written without it', () => {
    expect(() =>
      writeLetter(
        { kind: 'set-password', linkId: crypto.randomUUID() },
        { ...essential, link: null },
      ),
    ).toThrow(RangeError);
  });

  it('give dates in the zone that they are for, across a clock change', () => {
    const letter = sampleLetters.find(({ kind }) => kind === 'due-tomorrow');
    if (letter?.kind !== 'due-tomorrow') throw new Error('there is no sample');
    const said = (dueAt: string, timeZone: string) =>
      /^Due: (.*)$/m.exec(writeLetter({ ...letter, dueAt, timeZone }, sampleContext).text)?.[1];
    expect(said('2026-10-25T00:30:00Z', 'Europe/London')).toBe(
      'Sunday 25 October 2026, 01:30 (London time)',
    );
    expect(said('2026-10-25T18:30:00Z', 'Europe/London')).toBe(
      'Sunday 25 October 2026, 18:30 (London time)',
    );
    expect(said('2026-10-25T18:30:00Z', 'America/New_York')).toBe(
      'Sunday 25 October 2026, 14:30 (New York time)',
    );
    expect(said('2026-12-09T00:00:00Z', 'Europe/London')).toBe(
      'Tuesday 8 December 2026, midnight (London time)',
    );
  });
});
