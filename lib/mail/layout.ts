import { oneLine, type Draft, type LetterContext, type Piece, type Written } from './draft';

/** The light tokens of the site's look; mail programs know no custom properties. */
const colour = {
  paper: '#FBFAF5',
  board: '#F1ECE1',
  rule: '#CFC6B4',
  ink: '#20251F',
  pencil: '#59604F',
  chalk: '#1F5C8F',
  brass: '#8F5708',
} as const;

const family =
  "'Atkinson Hyperlegible Next','Atkinson Hyperlegible',Verdana,'Segoe UI',Arial,sans-serif";
const headingFamily = "Besley,Rockwell,'Roboto Slab',Georgia,serif";
const paragraph = 'margin:0 0 16px';

/** Lays a draft out as plain text and as HTML that says the same. */
export function layOut(draft: Draft, context: LetterContext): Written {
  const subject = oneLine(draft.subject);
  const greeting = context.readerName === null ? 'Hello,' : `Hello ${oneLine(context.readerName)},`;
  const pieces: readonly Piece[] = [{ say: greeting }, ...draft.pieces];
  return {
    subject,
    text: `${[...pieces.map(textOf), closingText(context)].join('\n\n')}\n`,
    html: documentOf(subject, pieces.map(htmlOf).join('\n'), context),
  };
}

function closingText({ siteAddress, unsubscribeAddress }: LetterContext): string {
  const lines = ['-- ', 'Hornbeam', siteAddress];
  if (unsubscribeAddress !== null) {
    lines.push('', 'No more letters about your classes:', unsubscribeAddress);
  }
  return lines.join('\n');
}

function textOf(piece: Piece): string {
  if ('say' in piece) return wrap(oneLine(piece.say));
  if ('press' in piece) return `${piece.press}:\n${piece.href}`;
  if ('heading' in piece) return oneLine(piece.heading).toUpperCase();
  if ('list' in piece) return piece.list.map((item) => wrap(oneLine(item), '- ', '  ')).join('\n');
  if ('facts' in piece) {
    return piece.facts.map(([name, value]) => `${oneLine(name)}: ${oneLine(value)}`).join('\n');
  }
  if ('quote' in piece)
    return linesOf(piece.quote)
      .map((line) => wrap(line, '> ', '> '))
      .join('\n');
  return wrap(oneLine(piece.aside));
}

function htmlOf(piece: Piece): string {
  if ('say' in piece) return `<p style="${paragraph}">${escape(oneLine(piece.say))}</p>`;
  if ('press' in piece) return buttonOf(piece.press, piece.href);
  if ('heading' in piece) {
    return `<h2 style="margin:24px 0 8px;font:600 19px/1.3 ${headingFamily}">${escape(oneLine(piece.heading))}</h2>`;
  }
  if ('list' in piece) {
    const items = piece.list.map(
      (item) => `<li style="margin:0 0 4px">${escape(oneLine(item))}</li>`,
    );
    return `<ul style="margin:0 0 16px;padding-left:20px">${items.join('')}</ul>`;
  }
  if ('facts' in piece) return factsOf(piece.facts);
  if ('quote' in piece) {
    const lines = linesOf(piece.quote).map(escape).join('<br>');
    return `<blockquote style="margin:0 0 16px;padding:8px 16px;border-left:4px solid ${colour.brass};background:${colour.board}">${lines}</blockquote>`;
  }
  return `<p style="${paragraph};font-size:15px;color:${colour.pencil}">${escape(oneLine(piece.aside))}</p>`;
}

/** The address is written out too, for programs that show no button and for reading aloud. */
function buttonOf(label: string, href: string): string {
  const address = escape(href);
  return `<p style="margin:24px 0 8px"><a href="${address}" style="display:inline-block;padding:12px 20px;background:${colour.chalk};color:${colour.paper};font-weight:600;text-decoration:none;border-radius:2px">${escape(oneLine(label))}</a></p>
<p style="margin:0 0 24px;font-size:15px;color:${colour.pencil};overflow-wrap:anywhere;word-break:break-word">${address}</p>`;
}

function factsOf(facts: readonly (readonly [string, string])[]): string {
  const rows = facts.map(
    ([name, value]) =>
      `<tr><th scope="row" style="padding:4px 16px 4px 0;text-align:left;vertical-align:top;font-weight:400;color:${colour.pencil}">${escape(oneLine(name))}</th><td style="padding:4px 0;vertical-align:top;font-weight:600">${escape(oneLine(value))}</td></tr>`,
  );
  return `<table style="margin:0 0 16px;border-collapse:collapse">${rows.join('')}</table>`;
}

function documentOf(subject: string, body: string, context: LetterContext): string {
  const { siteAddress, unsubscribeAddress } = context;
  const small = `font-size:15px;color:${colour.pencil}`;
  const link = (href: string, text: string) =>
    `<a href="${escape(href)}" style="color:${colour.chalk}">${escape(text)}</a>`;
  const unsubscribe =
    unsubscribeAddress === null
      ? ''
      : `<p style="margin:8px 0 0">${link(unsubscribeAddress, 'No more letters about your classes')}</p>`;
  return `<!doctype html>
<html lang="en-GB">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width">
<meta name="color-scheme" content="light">
<title>${escape(subject)}</title>
</head>
<body style="margin:0;background:${colour.paper};color:${colour.ink};font:17px/1.6 ${family}">
<div style="max-width:600px;margin:0 auto;padding:24px 16px">
<p style="margin:0;font:600 22px/1.2 ${headingFamily}">Hornbeam</p>
<div style="margin:8px 0 24px;border-top:1px solid ${colour.rule}"></div>
${body}
<div style="margin:32px 0 0;padding:12px 0 0;border-top:1px solid ${colour.rule};${small}">
<p style="margin:0">${link(siteAddress, siteAddress)}</p>${unsubscribe}
</div>
</div>
</body>
</html>
`;
}

function linesOf(text: string): string[] {
  return text
    .trim()
    .split(/\r\n|[\r\n\u2028\u2029]/)
    .map(oneLine);
}

/** Lines of at most 72 characters; a word that is longer stands whole. */
function wrap(text: string, first = '', rest = first): string {
  const lines: string[] = [];
  let line = first;
  let empty = true;
  for (const word of text.split(' ')) {
    if (!empty && line.length + 1 + word.length > 72) {
      lines.push(line);
      line = rest;
      empty = true;
    }
    line += empty ? word : ` ${word}`;
    empty = false;
  }
  return [...lines, line].join('\n');
}

function escape(text: string): string {
  return text.replace(/[&<>"']/g, (mark) => `&#${mark.charCodeAt(0)};`);
}
