/** `CompanyPartNumber` as people say it: company part number. */
export const subjectWords = (subject: string): string =>
  subject.replace(/(?<=[a-z])[A-Z]/g, (letter) => ` ${letter}`).toLowerCase();

/** `set-last-order-date` as people say it. */
export const actionWords = (action: string): string => action.replaceAll('-', ' ');
