const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
/** Days without a time of day are days of a calendar, the same everywhere. */
const calendarDay = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});
const moment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
});

/** `1 Dec 2026`, from a day (`2026-12-01`) or a moment, both ISO 8601. */
export function dayWords(iso: string): string {
  return /^\d{4}-\d{2}-\d{2}$/.test(iso) ? calendarDay.format(new Date(iso)) : day.format(new Date(iso));
}

/** `1 Dec 2026, 13:14`, in the reader's time zone; the text as it is where it is no moment. */
export function momentWords(iso: string): string {
  const date = new Date(iso);
  return Number.isNaN(date.getTime()) ? iso : moment.format(date);
}
