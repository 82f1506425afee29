import { afterEach, beforeEach, expect, vi, type MockInstance } from 'vitest';

/** A test that writes to `console.error` has failed, whatever it asserts. */
let spy: MockInstance<typeof console.error>;

beforeEach(() => {
  spy = vi.spyOn(console, 'error');
});

afterEach(() => {
  const calls = spy.mock.calls.map((call) => call.map(String).join(' '));
  spy.mockRestore();
  expect(calls, 'console.error was called').toEqual([]);
});
