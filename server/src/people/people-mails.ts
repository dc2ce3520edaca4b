import type { MailContent } from '../platform/mail/mail-content.js';

/** What the mails about accounts say; each names what happened and what to do if one did not ask for it. */
export interface Letter {
  readonly subject: string;
  readonly content: MailContent;
}

const notAsked = 'If you did not ask for this, you need do nothing: without this mail nobody can go on.';

export function signUpLetter(name: string, url: string): Letter {
  return {
    subject: 'Confirm your address',
    content: {
      heading: `Welcome, ${name}`,
      paragraphs: ['You asked for an account with this address. Confirm it by choosing a password.'],
      action: { label: 'Choose a password', url },
      closing: ['The link works once, and for a day.', notAsked],
    },
  };
}

export function accountExistsLetter(baseUrl: string): Letter {
  return {
    subject: 'You have an account already',
    content: {
      heading: 'You have an account already',
      paragraphs: [
        'Somebody, perhaps you, asked for a new account with this address. There is one, and it is unchanged.',
      ],
      action: { label: 'Sign in', url: `${baseUrl}/sign-in` },
      closing: ['If you forgot the password, ask for a new one on that page.'],
    },
  };
}

export function accountClosedLetter(): Letter {
  return {
    subject: 'Your account is closed',
    content: {
      heading: 'Your account is closed',
      paragraphs: [
        'Somebody, perhaps you, tried to get into the account of this address. It is closed; write to us to open it.',
      ],
    },
  };
}

export function invitationLetter(name: string, inviter: string, url: string): Letter {
  return {
    subject: `${inviter} asks you to join`,
    content: {
      heading: `Welcome, ${name}`,
      paragraphs: [`${inviter} made an account for you. Choose a password to use it.`],
      action: { label: 'Choose a password', url },
      closing: ['The link works once, and for a week.', 'If you do not know what this is about, you need do nothing.'],
    },
  };
}

export function passwordResetLetter(url: string): Letter {
  return {
    subject: 'Choose a new password',
    content: {
      heading: 'Choose a new password',
      paragraphs: ['You said that you forgot your password. Choose a new one; the old one works until then.'],
      action: { label: 'Choose a new password', url },
      closing: ['The link works once, and for half an hour.', notAsked],
    },
  };
}

export function noAccountLetter(baseUrl: string): Letter {
  return {
    subject: 'There is no account with this address',
    content: {
      heading: 'There is no account with this address',
      paragraphs: [
        'Somebody, perhaps you, asked for a new password. This address has no account; perhaps another one of yours has.',
      ],
      action: { label: 'Make an account', url: `${baseUrl}/sign-up` },
      closing: ['If it was not you, you need do nothing.'],
    },
  };
}

export function passwordChangedLetter(baseUrl: string): Letter {
  return {
    subject: 'Your password was changed',
    content: {
      heading: 'Your password was changed',
      paragraphs: ['The password of your account was changed just now, and all other devices were signed out.'],
      action: { label: 'Sign in', url: `${baseUrl}/sign-in` },
      closing: ['If it was not you, ask for a new password at once, and tell us.'],
    },
  };
}

export function emailChangeLetter(url: string): Letter {
  return {
    subject: 'Confirm your new address',
    content: {
      heading: 'Confirm your new address',
      paragraphs: ['Your account is to use this address from now on.'],
      action: { label: 'Use this address', url },
      closing: ['The link works once, and for two hours.', notAsked],
    },
  };
}

export function emailChangedLetter(): Letter {
  return {
    subject: 'Your account uses another address now',
    content: {
      heading: 'Your account uses another address now',
      paragraphs: [
        'The address of your account was changed just now. Mails will go to the new one; this is the last to the old.',
      ],
      closing: ['If it was not you, write to us at once.'],
    },
  };
}
