/** Why a letter could not be handed over, and whether trying again can help. */
export interface Failure {
  /** In plain words; it never holds a link. */
  readonly reason: string;
  readonly final: boolean;
}

interface MailError {
  readonly code?: unknown;
  readonly responseCode?: unknown;
  readonly response?: unknown;
}

/** Reads what nodemailer threw. Anything that is not an answer about this letter may pass. */
export function failureOf(error: unknown): Failure {
  const { code, responseCode, response } = (
    typeof error === 'object' && error !== null ? error : {}
  ) as MailError;
  const answer = answerOf(response);
  const refused = typeof responseCode === 'number' && responseCode >= 500 && responseCode < 600;
  switch (code) {
    case 'EENVELOPE':
      return { reason: `The mail server refused the address${answer}.`, final: refused };
    case 'EMESSAGE':
      return { reason: `The mail server refused the letter${answer}.`, final: refused };
    case 'EAUTH':
      return { reason: `The mail server refused our sign-in${answer}.`, final: false };
    case 'ETLS':
      return { reason: 'The mail server offers no safe connection.', final: false };
    case 'EDNS':
      return { reason: 'The name of the mail server leads nowhere.', final: false };
    case 'ECONNECTION':
    case 'ESOCKET':
    case 'ETIMEDOUT':
    case 'ECONNREFUSED':
      return { reason: 'The mail server did not answer.', final: false };
    default:
      return { reason: `The letter could not be handed over${answer}.`, final: false };
  }
}

/** The server's own first line, without anything that looks like an address of a page. */
function answerOf(response: unknown): string {
  if (typeof response !== 'string') return '';
  const line = (response.split(/[\r\n]/)[0] ?? '').replace(/https?:\/\/\S+/g, '…').slice(0, 200);
  return line.trim() === '' ? '' : `: ${line.trim().replace(/\.$/, '')}`;
}
