import type { AddressObject } from 'mailparser';
import type { MailLetter, MailSummary } from './dto/mail.dto';
import type { CaughtMail } from './mail-box';

const LINK = /https?:\/\/[^\s<>"']+/g;

export function presentSummary({ id, mail }: CaughtMail): MailSummary {
  return {
    id,
    from: addressText(mail.from),
    to: addressText(mail.to),
    subject: mail.subject ?? '',
    date: mail.date?.toISOString() ?? '',
  };
}

export function presentLetter(caught: CaughtMail): MailLetter {
  const text = caught.mail.text ?? '';
  const { id, from, to, subject, date } = presentSummary(caught);
  return { id, from, to, subject, date, text, links: text.match(LINK) ?? [] };
}

function addressText(addresses: AddressObject | AddressObject[] | undefined): string {
  return [addresses ?? []]
    .flat()
    .map((address) => address.text)
    .join(', ');
}
