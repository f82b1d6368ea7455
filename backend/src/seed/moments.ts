/** A day of the files at an hour of the working day, as the database keeps moments. */
export function momentOf(day: string, hour = 9): string {
  return `${day}T${String(hour).padStart(2, '0')}:00:00.000Z`;
}

/** The day so many days later (negative: earlier). */
export function dayAfter(day: string, days: number): string {
  const moment = new Date(`${day}T00:00:00.000Z`);
  moment.setUTCDate(moment.getUTCDate() + days);
  return moment.toISOString().slice(0, 10);
}
