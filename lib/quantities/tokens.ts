/** A piece of what was typed. `glued` says that no space stood before it. */
export type Token =
  | { readonly kind: 'digits'; readonly text: string; readonly glued: boolean }
  | { readonly kind: 'word'; readonly text: string; readonly glued: boolean }
  | { readonly kind: 'mark'; readonly text: string; readonly glued: boolean };

/** The longest answer that is looked at. */
export const longest = 60;

const samePlainly: Readonly<Record<string, string>> = {
  '−': '-',
  '–': '-',
  '‐': '-',
  '‑': '-',
  '′': "'",
  '’': "'",
  '‘': "'",
  ʹ: "'",
  '″': '"',
  '”': '"',
  '“': '"',
  ʺ: '"',
  '⁄': '/',
  '∕': '/',
  '∶': ':',
  º: '°',
  '˚': '°',
};

const vulgarFractions: Readonly<Record<string, string>> = {
  '¼': '1/4',
  '½': '1/2',
  '¾': '3/4',
  '⅐': '1/7',
  '⅑': '1/9',
  '⅒': '1/10',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

const marks = new Set(['-', '+', '/', ':', "'", '"']);

/**
 * What was typed in pieces, with typographic primes, fractions, minus signs and spaces made plain.
 * `null` when a character belongs to nothing that can be read. One pass, whatever the text.
 * @example tokens('3⅛″') // 3, 1/8 as three tokens after a space, "
 */
export function tokens(text: string): readonly Token[] | null {
  const found: Token[] = [];
  let glued = true;
  let at = 0;
  while (at < text.length) {
    const character = text.charAt(at);
    const vulgar = vulgarFractions[character];
    const plain = samePlainly[character] ?? character;
    if (/\s/.test(plain)) {
      glued = false;
      at += 1;
    } else if (vulgar !== undefined) {
      found.push(...fraction(vulgar, found.at(-1)?.kind === 'digits' ? false : glued));
      glued = true;
      at += 1;
    } else if (marks.has(plain)) {
      const doubled = plain === "'" && (samePlainly[text.charAt(at + 1)] ?? text[at + 1]) === "'";
      found.push({ kind: 'mark', text: doubled ? '"' : plain, glued });
      glued = true;
      at += doubled ? 2 : 1;
    } else {
      const run = runFrom(text, at);
      if (run === null) return null;
      found.push({ ...run, glued });
      glued = true;
      at += run.text.length;
    }
  }
  return found;
}

function fraction(text: string, glued: boolean): Token[] {
  const [above = '', below = ''] = text.split('/');
  return [
    { kind: 'digits', text: above, glued },
    { kind: 'mark', text: '/', glued: true },
    { kind: 'digits', text: below, glued: true },
  ];
}

/** The longest run of digits and decimal marks, or of letters, or a single % or °. */
function runFrom(text: string, start: number): { kind: 'digits' | 'word'; text: string } | null {
  const first = text.charAt(start);
  if (first === '%' || first === '°') return { kind: 'word', text: first };
  const kind = /[0-9.,]/.test(first) ? 'digits' : /[A-Za-z]/.test(first) ? 'word' : null;
  if (kind === null) return null;
  const belongs = kind === 'digits' ? /[0-9.,]/ : /[A-Za-z]/;
  let end = start;
  while (end < text.length && belongs.test(text.charAt(end))) end += 1;
  return { kind, text: text.slice(start, end) };
}
