import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expects } from '@/lib/quantities/expects';
import {
  countField,
  lengthField,
  plainField,
  ratioField,
  scaleField,
  turningField,
  type Field,
} from '@/lib/quantities/field';
import { readQuantity } from '@/lib/quantities/read';
import { convert, counterpart } from '@/lib/quantities/units';
import { write, writeBoth, writeNumber } from '@/lib/quantities/write';

const mm = lengthField('metric');
const inches = lengthField('inch');
const angle: Field = { dimension: 'angle', unit: '°' };
const ratio = ratioField('the crank', 'the lantern');
const share: Field = { dimension: 'share', unit: '%' };
const force: Field = { dimension: 'force', unit: 'N' };
const speed: Field = { dimension: 'speed', unit: 'mm/s' };
const time: Field = { dimension: 'time', unit: 's' };
const rate: Field = { dimension: 'rate', unit: '/h' };

const read = (text: string, field: Field) => {
  const reading = readQuantity(text, field);
  return reading.ok ? reading.value : reading.reason;
};
const echo = (text: string, field: Field) => {
  const reading = readQuantity(text, field);
  return reading.ok ? reading.echo : reading.message;
};

describe('what a woodworker writes', () => {
  it.each([
    ['79.4', mm, 79.4],
    ['79,4 mm', mm, 79.4],
    ['3 1/8 in', mm, 79.375],
    ['3-1/8"', mm, 79.375],
    ['3⅛″', mm, 79.375],
    ['3-⅛ in', mm, 79.375],
    ['3 1/8', inches, 3.125],
    ['3 1⁄8', inches, 3.125],
    ['5/16', inches, 0.3125],
    [`1' 2 1/2"`, mm, 368.3],
    ['1′-2½″', mm, 368.3],
    ['1 ft 2 1/2 in', inches, 14.5],
    ["1'", inches, 12],
    ["6''", inches, 6],
    ['7.94 cm', mm, 79.4],
    ['79.4mm', inches, 79.4 / 25.4],
    ['-2.5', mm, -2.5],
    ['−2.5', mm, -2.5],
    ['–3 1/8"', inches, -3.125],
    ['.5', mm, 0.5],
    ['22.5°', angle, 22.5],
    ["22° 30'", angle, 22.5],
    ['22°30′', angle, 22.5],
    ["30'", angle, 0.5],
    ['22 deg', angle, 22],
    ['3:1', ratio, 3],
    ['3', ratio, 3],
    ['3/1', ratio, 3],
    ['1/3', ratio, 1 / 3],
    ['1 : 3', ratio, 1 / 3],
    ['3∶2', scaleField, 1.5],
    ['90 rpm', turningField, 90],
    ['90 r/min', turningField, 90],
    ['1.5 r/s', turningField, 90],
    ['36', countField('teeth'), 36],
    ['36 teeth', countField('teeth'), 36],
    ['3 %', share, 3],
    ['3 per cent', share, 3],
    ['40 N', force, 40],
    ['3/4 in/s', speed, 19.05],
    ['1.2 m/min', speed, 20],
    ['1 min 30 s', time, 90],
    ['18000 /h', rate, 18000],
    ['18000 per hour', rate, 18000],
    ['3 1/4', plainField, 3.25],
  ])('%s', (text, field, value) => {
    expect(read(text, field)).toBeCloseTo(value, 9);
  });

  it('reads pounds-force by the standard pound and standard gravity', () => {
    expect(read('9 lbf', force)).toBeCloseTo(9 * 4.4482216152605, 9);
  });
});

describe('what is never guessed', () => {
  it.each([
    ['5/16', mm, 'which-fraction'],
    ['3 1/8', mm, 'which-fraction'],
    ['3/4', speed, 'which-fraction'],
    ['1,250', mm, 'which-comma'],
    ['1,250', ratio, 'which-comma'],
    ['1,250.5', mm, 'marks-between'],
    ['1.250.000', mm, 'marks-between'],
    ['1 250', mm, 'unreadable'],
    ["1' 2", inches, 'no-last-unit'],
    ['22° 30', angle, 'no-last-unit'],
    [`1' 14"`, inches, 'does-not-add'],
    [`2" 1'`, inches, 'does-not-add'],
    [`1.5' 2"`, inches, 'does-not-add'],
    ['3 5/4', inches, 'top-heavy'],
    ['5/0', inches, 'nought-below'],
    ['3:0', ratio, 'nought-below'],
    ['3 - 1/8', inches, 'unreadable'],
    ['22°', mm, 'other-dimension'],
    ['5 mm', turningField, 'other-dimension'],
    ['3 mm', ratio, 'other-dimension'],
    ['3:1', mm, 'ratio-elsewhere'],
    ['3:1:2', ratio, 'unreadable'],
    ['12.5', countField('teeth'), 'not-whole'],
    ['', mm, 'empty'],
    ['   ', mm, 'empty'],
    ['about 80', mm, 'unreadable'],
    ['80 or so', mm, 'unreadable'],
    ['2*40', mm, 'unreadable'],
    ['1e3', mm, 'unreadable'],
    ['٣', mm, 'unreadable'],
    ['NaN', mm, 'unreadable'],
    ['constructor', mm, 'unreadable'],
    ['3 __proto__', mm, 'unreadable'],
    ['9999999999999', mm, 'too-large'],
    ['1'.repeat(61), mm, 'too-long'],
    ['1'.repeat(40), mm, 'too-long'],
  ])('%s', (text, field, reason) => {
    expect(read(text, field)).toBe(reason);
  });

  it('offers both readings of a bare fraction in a field of millimetres', () => {
    expect(readQuantity('5/16', mm)).toMatchObject({
      ok: false,
      readings: ['5/16 in = 7.94 mm', '5/16 mm = 0.3125 mm'],
    });
  });

  it('offers both readings of a comma before three digits', () => {
    expect(readQuantity('1,250', mm)).toMatchObject({ ok: false, readings: ['1.250', '1250'] });
  });

  it('names what is expected', () => {
    expect(echo('about 80', mm)).toContain(expects(mm));
    expect(expects(ratio)).toBe(
      'turns of the crank for one turn of the lantern, such as 3, 3:1 or 1/3',
    );
    expect(expects({ ...mm, places: 4 })).toContain('4 places');
  });
});

describe('what is said back', () => {
  it.each([
    ['3 1/8 in', mm, '3 1/8 in = 79.4 mm'],
    ['3 1/8', inches, '3 1/8 in = 79.4 mm'],
    ['79,4', mm, '79.4 mm'],
    ['79.4 mm', inches, '79.4 mm = 3.126 in'],
    [`1' 2 1/2"`, mm, '1 ft 2 1/2 in = 368.3 mm'],
    ["22° 30'", angle, '22° 30′ = 22.5°'],
    ['3:1', ratio, '3 : 1, that is 3 turns of the crank for one turn of the lantern'],
    ['1/3', ratio, '1/3 turn of the crank for one turn of the lantern'],
    ['3:2', scaleField, '3 : 2, that is 1.5 times'],
    ['36', countField('teeth'), '36 teeth'],
    ['12,5', turningField, '12.5 rpm'],
  ])('%s', (text, field, said) => {
    expect(echo(text, field)).toBe(said);
  });
});

describe('writing', () => {
  it('writes inches as fractions to sixty-fourths, and else to three places', () => {
    expect(write(3.125, 'in')).toBe('3 1/8 in');
    expect(write(-1 / 64, 'in')).toBe('−1/64 in');
    expect(write(3.13, 'in')).toBe('3.13 in');
    expect(write(0.0042, 'in')).toBe('0.0042 in');
  });

  it('writes both systems', () => {
    expect(writeBoth(3.125, 'in')).toBe('3 1/8 in = 79.4 mm');
    expect(writeBoth(12.5, 'rpm')).toBe('12.5 rpm');
  });

  it('never writes a minus before nought', () => {
    expect(writeNumber(-0.0001, 2)).toBe('0');
  });
});

describe('reading and writing together', () => {
  const run = { seed: 20260301, numRuns: 1500 };

  it('gives back every sixty-fourth of an inch exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: -64 * 400, max: 64 * 400 }), (marks) => {
        expect(read(write(marks / 64, 'in'), inches)).toBe(marks / 64 + 0);
      }),
      run,
    );
  });

  it('gives back what was written, to the places that were written', () => {
    const fields: Field[] = [mm, inches, angle, share, force, speed, time, turningField, rate];
    fc.assert(
      fc.property(
        fc.constantFrom(...fields),
        fc.double({ min: -9e4, max: 9e4, noNaN: true }),
        (field, value) => {
          const text = write(value, field.unit);
          const back = read(text, field);
          expect(typeof back).toBe('number');
          expect(Math.abs(Number(back) - value)).toBeLessThanOrEqual(0.06 + Math.abs(value) * 1e-9);
          expect(write(Number(back), field.unit)).toBe(text);
        },
      ),
      run,
    );
  });

  it('reads a length alike in either field once its unit is written', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 64 * 100 }), (marks) => {
        const text = write(marks / 64, 'in');
        const [metric, own] = [read(text, mm), read(text, inches)];
        expect(Number(metric)).toBeCloseTo(convert(Number(own), 'in', 'mm'), 9);
      }),
      run,
    );
  });

  it('answers any text with a finite number or a refusal that says what is expected', () => {
    const letters = fc.constantFrom(...'0123456789.,/:-−°\'"′″ ½⅛minft%rpdegNx⁄'.split(''));
    const text = fc.oneof(
      fc.string({ maxLength: 80 }),
      fc.array(letters, { maxLength: 40 }).map((each) => each.join('')),
    );
    const fields = [
      mm,
      inches,
      angle,
      ratio,
      scaleField,
      share,
      force,
      speed,
      time,
      rate,
      plainField,
      countField('teeth'),
    ];
    fc.assert(
      fc.property(text, fc.constantFrom(...fields), (typed, field) => {
        const reading = readQuantity(typed, field);
        if (reading.ok) expect(Number.isFinite(reading.value)).toBe(true);
        else expect(reading.message.length).toBeGreaterThan(20);
      }),
      { ...run, numRuns: 5000 },
    );
  });

  it('looks at sixty characters at most, however long the text', () => {
    for (const piece of ['1', ' ', '-', "'", '1/', '1 ', '½', ',', 'a']) {
      expect(read(piece.repeat(200_000), mm)).toBe('too-long');
    }
  });
});

describe('units', () => {
  it('has an inch of 25.4 mm exactly', () => {
    expect(convert(1, 'in', 'mm')).toBe(25.4);
    expect(convert(1, 'ft', 'in')).toBeCloseTo(12, 12);
  });

  it('names the other system’s unit, and none where both agree', () => {
    expect([counterpart('mm'), counterpart('in'), counterpart('rpm')]).toEqual(['in', 'mm', null]);
  });

  it('refuses to turn a length into a time', () => {
    expect(() => convert(1, 'mm', 's')).toThrow(RangeError);
    expect(() => convert(1, 'mm', '')).toThrow(RangeError);
  });
});
