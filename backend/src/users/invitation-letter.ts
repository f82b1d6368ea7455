import type { Letter } from '../mail/mail-topic';

/** The letter with the way in. The token stands behind the #, which browsers never send. */
export function invitationLetter(to: string, invitedBy: string, appUrl: string, token: string): Letter {
  return {
    to,
    subject: 'Your way into Resistry',
    text: [
      'Hello,',
      '',
      `${invitedBy} invites you to Resistry, the catalogue of approved resistors.`,
      'Choose your name and password here within seven days:',
      '',
      `${appUrl}/accept-invitation#token=${token}`,
      '',
      'If you do not know what this is about, leave the letter be: nothing happens.',
      '',
    ].join('\n'),
  };
}
