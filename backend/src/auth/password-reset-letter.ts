import type { Letter } from '../mail/mail-topic';

/** The letter with the way to a new password. The token stands behind the #, which browsers never send. */
export function passwordResetLetter(to: string, name: string, appUrl: string, token: string): Letter {
  return {
    to,
    subject: 'A new password for Resistry',
    text: [
      `Hello ${name},`,
      '',
      'somebody, most likely you, asked for a new password for your account at Resistry.',
      'Choose one here within the hour:',
      '',
      `${appUrl}/reset-password#token=${token}`,
      '',
      'If it was not you, nothing has changed and there is nothing to do.',
      '',
    ].join('\n'),
  };
}
