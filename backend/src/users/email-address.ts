/** The one form in which an address is kept and compared. */
export function normalisedEmail(text: string): string {
  return text.trim().toLowerCase();
}
