import 'server-only';
import { createHmac } from 'node:crypto';
import { linkEnvironment } from '@/lib/env';

/** What a one-time link is for. */
export type LinkPurpose =
  'set-password' | 'reset-password' | 'confirm-address' | 'change-address' | 'invitation';

const MINUTE = 60_000;
const DAY = 24 * 60 * MINUTE;

/** How long a link lives, in milliseconds. */
export const linkLifetimes: Readonly<Record<LinkPurpose, number>> = {
  invitation: 7 * DAY,
  'set-password': 7 * DAY,
  'confirm-address': DAY,
  'reset-password': 30 * MINUTE,
  'change-address': 30 * MINUTE,
};

const paths: Readonly<Record<LinkPurpose, string>> = {
  invitation: 'invitation',
  'confirm-address': 'invitation',
  'set-password': 'set-password',
  'reset-password': 'set-password',
  'change-address': 'confirm-address',
};

/**
 * The token of a link, worked out from its id and the server's secret: neither the database nor the
 * log of letters ever holds it, and whoever writes the letter can still put it there.
 */
export function linkToken(linkId: string): string {
  return createHmac('sha256', linkEnvironment().secret)
    .update(`one-time-link:${linkId}`)
    .digest('base64url');
}

/** The whole address of a link; its beginning is from the configuration, never from a request. */
export function linkAddress(purpose: LinkPurpose, linkId: string): string {
  return `${linkEnvironment().address}/${paths[purpose]}/${linkToken(linkId)}`;
}
