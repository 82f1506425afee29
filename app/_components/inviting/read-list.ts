import { longestList, readCsv, readPasted, type InviteeReading } from '@/lib/schemas/invitees';

/** A list of people out of a form: the chosen file, else what was typed; null when there is neither. */
export async function readList(
  form: FormData,
): Promise<{ readonly list: string; readonly reading: InviteeReading | null }> {
  const list = String(form.get('list') ?? '');
  const file = form.get('file');
  if (file instanceof File && file.size > 0) {
    // A letter may take four bytes; what is longer than that is refused without being read.
    const content =
      file.size > longestList * 4 ? ' '.repeat(longestList + 1) : decode(await file.arrayBuffer());
    return { list, reading: readCsv(content) };
  }
  return { list, reading: list.trim() === '' ? null : readPasted(list) };
}

/** UTF-8, or else what older spreadsheets write. */
function decode(bytes: ArrayBuffer): string {
  try {
    return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
