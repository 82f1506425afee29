import { CsvError, parse } from 'csv-parse/sync';
import { email as emailSchema } from './person';

/** Somebody to be invited, and the line that names them. */
export interface Invitee {
  readonly line: number;
  readonly email: string;
  readonly name: string | null;
}

/** A line that names nobody who could be invited: what it says, what is wrong, what is expected. */
export interface BadLine {
  readonly line: number;
  readonly text: string;
  readonly wrong: string;
  readonly expected: string;
}

/** A list of people as it was read. */
export interface InviteeReading {
  readonly good: readonly Invitee[];
  readonly bad: readonly BadLine[];
}

/** How many people one list may name, and how long it may be. */
export const mostInvitees = 200;
export const longestList = 200_000;

const nameLength = 100;
const anAddress = 'an address such as you@example.org';

/** Reads people as they are pasted: one a line or with commas between, `Name <address>` or plain. */
export function readPasted(text: string): InviteeReading {
  if (text.length > longestList) return refuse('', `longer than ${longestList} characters`, 'less');
  const entries = text
    .replace(/^\uFEFF/, '')
    .split(/\r\n|\n|\r/)
    .flatMap((line, index) =>
      (line.match(/(?:"[^"]*"|<[^>]*>|[^,;\t])+/g) ?? [])
        .map((part) => part.trim())
        .filter((part) => part !== '')
        .map((part) => ({ line: index + 1, text: part, ...nameAndAddress(part) })),
    );
  return sift(entries);
}

/**
 * Reads people from a CSV file. Its first line names the columns (name, or first name and last name,
 * and e-mail) or holds the first person already; commas, semicolons or tabs part the columns.
 */
export function readCsv(content: string): InviteeReading {
  if (content.length > longestList) {
    return refuse('', `longer than ${longestList} characters`, `a list of ${mostInvitees} people`);
  }
  if (content.includes('\u0000') || content.startsWith('PK')) {
    return refuse('', 'not a text file', 'the table saved as CSV');
  }
  const records = parseCsv(content);
  if (!Array.isArray(records)) return records;
  const [first] = records;
  if (first === undefined) return refuse('', 'empty', 'a line for each person');
  const columns = columnsOf(first.record);
  if (columns === null) {
    const text = first.record.join(', ');
    return refuse(text, 'no column of addresses', 'a first line such as "name,e-mail"');
  }
  const people = columns.named ? records.slice(1) : records;
  if (people.length === 0) return refuse('', 'only a heading', 'a line for each person below it');
  return sift(
    people.map(({ record, info }) => ({
      line: info.lines,
      text: record.join(', '),
      email: record[columns.email] ?? '',
      name: columns.names.map((column) => record[column] ?? '').join(' '),
    })),
  );
}

interface Entry {
  readonly line: number;
  readonly text: string;
  readonly email: string;
  readonly name: string;
}

function nameAndAddress(part: string): { name: string; email: string } {
  const both = /^"?([^"<]*)"?\s*<([^<>]*)>$/.exec(part);
  return both ? { name: both[1] ?? '', email: both[2] ?? '' } : { name: '', email: part };
}

/** Parts what can be invited from what cannot, each address once. */
function sift(entries: readonly Entry[]): InviteeReading {
  const good: Invitee[] = [];
  const bad: BadLine[] = [];
  const seen = new Map<string, number>();
  for (const { line, text, email, name } of entries) {
    const address = emailSchema.safeParse(email);
    const called = name.replace(/\s+/g, ' ').trim();
    const complain = (wrong: string, expected: string) =>
      bad.push({ line, text: text.slice(0, 200), wrong, expected });
    if (email.trim() === '') complain('no address', anAddress);
    else if (!address.success) complain('not an address', anAddress);
    else if (called.length > nameLength) {
      complain(`a name of ${called.length} characters`, `${nameLength} at most`);
    } else if (seen.has(address.data)) {
      complain(`named in line ${seen.get(address.data)} already`, 'each address once');
    } else if (good.length >= mostInvitees) {
      complain('too many at once', `${mostInvitees} people at most`);
    } else {
      seen.set(address.data, line);
      good.push({ line, email: address.data, name: called === '' ? null : called });
    }
  }
  return { good, bad };
}

function refuse(text: string, wrong: string, expected: string): InviteeReading {
  return { good: [], bad: [{ line: 1, text, wrong, expected }] };
}

interface CsvRecord {
  readonly record: readonly string[];
  readonly info: { readonly lines: number };
}

function parseCsv(content: string): CsvRecord[] | InviteeReading {
  const heading = content.split(/\r\n|\n|\r/, 1)[0] ?? '';
  const count = (sign: string) => heading.split(sign).length;
  const delimiter = [',', ';', '\t'].reduce((a, b) => (count(b) > count(a) ? b : a));
  try {
    return parse(content, {
      bom: true,
      delimiter,
      info: true,
      relax_column_count: true,
      skip_empty_lines: true,
      skip_records_with_empty_values: true,
      trim: true,
    }) as unknown as CsvRecord[];
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    const line = typeof error.lines === 'number' ? error.lines : 1;
    const wrong = 'a quotation mark that does not come in a pair';
    return { good: [], bad: [{ line, text: '', wrong, expected: '"Vik, Marit",marit@…' }] };
  }
}

interface Columns {
  readonly email: number;
  readonly names: readonly number[];
  /** Whether the first line names the columns. */
  readonly named: boolean;
}

function columnsOf(first: readonly string[]): Columns | null {
  const names = first.map((cell) => cell.toLowerCase().replace(/[^a-z]/g, ''));
  const column = (...known: string[]) => names.findIndex((name) => known.includes(name));
  const email = column('email', 'mail', 'emailaddress', 'mailaddress', 'address');
  if (email >= 0) {
    const whole = column('name', 'fullname');
    const parts = [column('firstname', 'givenname'), column('lastname', 'surname', 'familyname')];
    const named = whole >= 0 ? [whole] : parts.filter((part) => part >= 0);
    return { email, names: named, named: true };
  }
  const held = first.findIndex((cell) => emailSchema.safeParse(cell).success);
  if (held < 0) return null;
  return { email: held, names: first.map((_, at) => at).filter((at) => at !== held), named: false };
}
