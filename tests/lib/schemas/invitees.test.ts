import { describe, expect, it } from 'vitest';
import { longestList, readCsv, readPasted } from '@/lib/schemas/invitees';

const people = (list: ReturnType<typeof readCsv>) =>
  list.good.map(({ line, name, email }) => [line, name, email]);
const complaints = (list: ReturnType<typeof readCsv>) =>
  list.bad.map(({ line, wrong }) => [line, wrong]);

describe('a pasted list', () => {
  it('is read one a line, with commas or semicolons between, with names or without', () => {
    const list = readPasted(
      'marit@harbour.example, Ola Nordmann <OLA@harbour.example>;\r\n\r\n"Vik, Tora" <tora@harbour.example>',
    );
    expect(people(list)).toEqual([
      [1, null, 'marit@harbour.example'],
      [1, 'Ola Nordmann', 'ola@harbour.example'],
      [3, 'Vik, Tora', 'tora@harbour.example'],
    ]);
    expect(list.bad).toEqual([]);
  });

  it('names each line that is wrong, what is wrong, and what is expected', () => {
    const list = readPasted('a@b.example\nnobody\nA@B.example\nNo Address <>');
    expect(people(list)).toEqual([[1, null, 'a@b.example']]);
    expect(list.bad).toEqual([
      {
        line: 2,
        text: 'nobody',
        wrong: 'not an address',
        expected: 'an address such as you@example.org',
      },
      {
        line: 3,
        text: 'A@B.example',
        wrong: 'named in line 1 already',
        expected: 'each address once',
      },
      {
        line: 4,
        text: 'No Address <>',
        wrong: 'no address',
        expected: 'an address such as you@example.org',
      },
    ]);
  });

  it('takes two hundred at once and says which are too many', () => {
    const list = readPasted(Array.from({ length: 202 }, (_, n) => `p${n}@x.example`).join('\n'));
    expect(list.good).toHaveLength(200);
    expect(complaints(list)).toEqual([
      [201, 'too many at once'],
      [202, 'too many at once'],
    ]);
  });

  it('of nothing names nobody', () => {
    expect(readPasted(' \n,;\n')).toEqual({ good: [], bad: [] });
  });
});

describe('a CSV file', () => {
  it.each([
    ['commas and a heading', 'Name,E-mail\nMarit Vik,marit@x.example\n', 2],
    [
      'semicolons, a byte order mark and CRLF',
      '\uFEFFe-mail;name\r\nmarit@x.example;Marit Vik\r\n',
      2,
    ],
    ['tabs', 'email\tname\nmarit@x.example\tMarit Vik', 2],
    ['first and last names', 'First name,Surname,Mail\nMarit,Vik,marit@x.example', 2],
    ['no heading', 'Marit Vik,marit@x.example', 1],
    ['columns that nobody asked for', 'Town,Name,Email\nBergen,Marit Vik,marit@x.example', 2],
  ])('is read with %s', (_how, content, line) => {
    expect(readCsv(content)).toEqual({
      good: [{ line, name: 'Marit Vik', email: 'marit@x.example' }],
      bad: [],
    });
  });

  it('is read with quotation marks, signs between them and empty lines', () => {
    const list = readCsv('name,email\n"Vik, ""Mia""",m@x.example\n\n,\n"Ola",o@x.example\n');
    expect(people(list)).toEqual([
      [2, 'Vik, "Mia"', 'm@x.example'],
      [5, 'Ola', 'o@x.example'],
    ]);
  });

  it('names every bad row by its line in the file', () => {
    const list = readCsv('name,email\nA,a@x.example\nB,\nC,not one\nD,a@x.example,more\n');
    expect(people(list)).toEqual([[2, 'A', 'a@x.example']]);
    expect(complaints(list)).toEqual([
      [3, 'no address'],
      [4, 'not an address'],
      [5, 'named in line 2 already'],
    ]);
  });

  it.each([
    ['name,town\nA,B', 'no column of addresses'],
    ['', 'empty'],
    ['name,email\n', 'only a heading'],
    ['PK\u0003\u0004', 'not a text file'],
    ['name,email\n"A,a@x.example', 'a quotation mark that does not come in a pair'],
    ['a'.repeat(longestList + 1), `longer than ${longestList} characters`],
  ])('that cannot be read is refused with the reason', (content, wrong) => {
    const list = readCsv(content);
    expect(list.good).toEqual([]);
    expect(list.bad.map((line) => line.wrong)).toEqual([wrong]);
  });
});
