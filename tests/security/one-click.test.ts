import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET, POST } from '@/app/api/unsubscribe/[token]/route';
import { unsubscribeAddresses } from '@/lib/data/entry/unsubscribe';
import { wantsClassMail } from '@/lib/data/mail-preference';
import { openWorkshop, type Workshop } from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const tokenOf = (address: string) => ({
  params: Promise.resolve({ token: address.split('/').at(-1) ?? '' }),
});

/** What a mail program sends by RFC 8058: a form, without an Origin and without a cookie. */
function oneClick(
  address: string,
  body: BodyInit | null = 'List-Unsubscribe=One-Click',
  type?: string,
) {
  const headers: HeadersInit =
    body instanceof FormData ? {} : { 'Content-Type': type ?? 'application/x-www-form-urlencoded' };
  return POST(new Request(address, { method: 'POST', headers, body }), tokenOf(address));
}

describe('one click in a mail program', () => {
  it('ends letters about classes, in either form, and may be repeated', async () => {
    const { learner, classmate } = workshop;
    const address = unsubscribeAddresses(learner.personId).oneClick;
    expect((await oneClick(address)).status).toBe(200);
    expect((await oneClick(address)).status).toBe(200);
    expect(await wantsClassMail(learner)).toBe(false);
    const form = new FormData();
    form.set('List-Unsubscribe', 'One-Click');
    expect((await oneClick(unsubscribeAddresses(classmate.personId).oneClick, form)).status).toBe(
      200,
    );
    expect(await wantsClassMail(classmate)).toBe(false);
  });

  it('does nothing without the form that says so, such as a program that looks at every address', async () => {
    const { stranger } = workshop;
    const address = unsubscribeAddresses(stranger.personId).oneClick;
    for (const body of ['', 'List-Unsubscribe=Two-Clicks', 'x'.repeat(10_000)]) {
      expect((await oneClick(address, body)).status).toBe(422);
    }
    expect((await oneClick(address, '{}', 'application/json')).status).toBe(422);
    expect((await oneClick(address, null)).status).toBe(422);
    expect(await wantsClassMail(stranger)).toBe(true);
  });

  it('is not there for an address that is none of ours', async () => {
    const answer = await oneClick('http://127.0.0.1:5455/api/unsubscribe/made-up');
    expect(answer.status).toBe(404);
    expect(answer.headers.get('content-type')).toBe('application/problem+json');
  });

  it('shows the page to somebody who follows the address, and changes nothing', async () => {
    const { stranger } = workshop;
    const { oneClick: address, page } = unsubscribeAddresses(stranger.personId);
    const answer = await GET(new Request(address), tokenOf(address));
    expect(answer.status).toBe(303);
    expect(answer.headers.get('location')).toBe(page);
    expect(await wantsClassMail(stranger)).toBe(true);
  });
});
