import 'server-only';
import { createTransport, type Transporter } from 'nodemailer';
import { siteEnvironment } from '@/lib/env';
import type { Written } from './draft';

/** A written letter with its envelope. */
export interface Outgoing extends Written {
  readonly to: string;
  /** The same for every try, so that a second copy can be known for what it is. */
  readonly messageId: string;
  readonly date: Date;
  /** Where one click ends such letters (RFC 8058); null for what is essential. */
  readonly oneClickAddress: string | null;
}

/** Hands letters to the mail server of the configuration. */
export interface Postbox {
  readonly send: (letter: Outgoing) => Promise<void>;
  readonly close: () => void;
}

/** Half a minute for each step: a job must not outlast the patience of its queue. */
const patience = 30_000;

export function openPostbox(): Postbox {
  const { url, from } = siteEnvironment().mail;
  const transport: Transporter = createTransport(
    {
      url,
      connectionTimeout: patience,
      greetingTimeout: patience,
      socketTimeout: patience,
      disableFileAccess: true,
      disableUrlAccess: true,
    },
    { from },
  );
  return {
    send: async (letter) => {
      await transport.sendMail(mailOf(letter));
    },
    close: () => transport.close(),
  };
}

function mailOf({ to, messageId, date, subject, text, html, oneClickAddress }: Outgoing) {
  return {
    to: { name: '', address: to },
    messageId,
    date,
    subject,
    text,
    html,
    headers: {
      // RFC 3834: nobody's holiday notice should answer.
      'Auto-Submitted': 'auto-generated',
      ...(oneClickAddress === null
        ? {}
        : {
            'List-Unsubscribe': `<${oneClickAddress}>`,
            'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
          }),
    },
  };
}
