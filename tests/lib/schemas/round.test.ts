import { describe, expect, it } from 'vitest';
import { attemptRequestSchema, responseSchema, roundRequestSchema } from '@/lib/schemas/round';

const roundId = '7e57d004-2b97-4e7a-b45f-5387367791cd';
const takes = (response: unknown) => responseSchema.safeParse(response).success;

describe('what may be sent', () => {
  it('takes text, options and settings by part', () => {
    expect(
      takes({
        answers: {
          far: '270 mm',
          sense: ['852xyznb'],
          pins: { farPin: 270, farRunsIn: 'east-west' },
        },
      }),
    ).toBe(true);
  });

  it('takes no field that it does not know', () => {
    expect(takes({ answers: {}, verdict: 'right' })).toBe(false);
    expect(
      attemptRequestSchema.safeParse({ roundId, response: { answers: {} }, learnerId: 'x' })
        .success,
    ).toBe(false);
    expect(roundRequestSchema.safeParse({ units: 'inch', seed: 1 }).success).toBe(false);
    expect(roundRequestSchema.safeParse({ units: 'cubits' }).success).toBe(false);
  });

  it('takes no name that is no part’s, and nothing too long', () => {
    expect(takes(JSON.parse('{"answers": {"__proto__x": "1"}}'))).toBe(false);
    expect(takes({ answers: { far: '1'.repeat(61) } })).toBe(false);
    expect(takes({ answers: { far: Array.from({ length: 13 }, () => 'x') } })).toBe(false);
    expect(takes({ answers: { far: 270 } })).toBe(false);
  });

  it('wants a round by its UUID and a time with its zone', () => {
    const request = { roundId, response: { answers: {} }, answeredAt: '2026-03-01T10:00:00+02:00' };
    expect(attemptRequestSchema.safeParse(request).success).toBe(true);
    expect(attemptRequestSchema.safeParse({ ...request, roundId: '1' }).success).toBe(false);
    expect(attemptRequestSchema.safeParse({ ...request, answeredAt: 'yesterday' }).success).toBe(
      false,
    );
  });
});
