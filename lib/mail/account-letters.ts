import { sayLifetime, sayMoment } from './dates';
import type { Draft, LetterContext, Piece } from './draft';
import type { LetterOf } from './letter';

/** Letters that an account needs: they are sent whatever the reader has chosen. */

const ignore: Piece = {
  aside: 'If you did not ask for this, do nothing: nothing changes until the link is used.',
};

/** The button with its one-time link, and how long it works. */
function press(label: string, { link }: LetterContext): readonly Piece[] {
  if (link === null) throw new RangeError(`press: "${label}" needs its link`);
  return [
    { press: label, href: link.href },
    { say: `The link works once, and for ${sayLifetime(link.goodForMinutes)}.` },
  ];
}

export function invitation(letter: LetterOf<'invitation'>, context: LetterContext): Draft {
  const { className, inviterName } = letter;
  const to = className === undefined ? 'the workshop' : `the class “${className}”`;
  return {
    subject: className === undefined ? 'You are invited to Hornbeam' : `Come and join ${className}`,
    pieces: [
      { say: `${inviterName} invites you to ${to} on Hornbeam.` },
      {
        say: 'Hornbeam teaches the mechanisms that move wooden things: you turn them, size them, and are told at once what is right.',
      },
      ...press('Accept the invitation', context),
      {
        aside:
          'If you do not know why you got this, you can leave it: no account is made by itself.',
      },
    ],
  };
}

export function setPassword(_letter: LetterOf<'set-password'>, context: LetterContext): Draft {
  return {
    subject: 'Set your password for Hornbeam',
    pieces: [
      { say: 'The workshop’s administrator has made you a link that sets your password.' },
      ...press('Set your password', context),
    ],
  };
}

export function resetPassword(_letter: LetterOf<'reset-password'>, context: LetterContext): Draft {
  return {
    subject: 'Choose a new password',
    pieces: [
      { say: 'Somebody, we hope you, asked for a new password for your account.' },
      ...press('Choose a new password', context),
      ignore,
    ],
  };
}

export function confirmAddress(
  _letter: LetterOf<'confirm-address'>,
  context: LetterContext,
): Draft {
  return {
    subject: 'Confirm your address',
    pieces: [
      { say: 'One step is left: confirm that this address is yours.' },
      ...press('Confirm the address', context),
      ignore,
    ],
  };
}

export function changeAddress(_letter: LetterOf<'change-address'>, context: LetterContext): Draft {
  return {
    subject: 'Confirm your new address',
    pieces: [
      { say: 'You want to sign in with this address from now on. Confirm that it is yours.' },
      ...press('Use this address', context),
      ignore,
    ],
  };
}

export function addressChanged(
  _letter: LetterOf<'address-changed'>,
  { writtenAt, timeZone }: LetterContext,
): Draft {
  return {
    subject: 'Your address was changed',
    pieces: [
      {
        say: `The address of your account was changed on ${sayMoment(writtenAt, timeZone)}. This is the last letter to the old one.`,
      },
      { say: 'If that was not you, tell the workshop’s administrator today.' },
    ],
  };
}

export function passwordChanged(
  _letter: LetterOf<'password-changed'>,
  { writtenAt, timeZone, siteAddress }: LetterContext,
): Draft {
  return {
    subject: 'Your password was changed',
    pieces: [
      {
        say: `The password of your account was changed on ${sayMoment(writtenAt, timeZone)}, and every other device was signed out.`,
      },
      {
        say: 'If that was not you, choose a new password now and tell the workshop’s administrator.',
      },
      { press: 'Choose a new password', href: `${siteAddress}/forgotten` },
    ],
  };
}

export function accountExists(
  { className }: LetterOf<'account-exists'>,
  { siteAddress }: LetterContext,
): Draft {
  const wanted = className === undefined ? 'come in' : `join “${className}”`;
  return {
    subject: 'You have an account already',
    pieces: [
      {
        say: `Somebody, we hope you, wanted to ${wanted} with this address. It has an account already.`,
      },
      { press: 'Sign in', href: `${siteAddress}/sign-in` },
      { press: 'Choose a new password', href: `${siteAddress}/forgotten` },
      { aside: 'If it was not you, do nothing: nothing has changed.' },
    ],
  };
}
