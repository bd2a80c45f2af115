/** The calendar date of an instant in the club's time zone, as 2026-11-30. */
export function localDate(instant: Date, timeZone: string): string {
  // The Swedish locale writes dates as ISO 8601 does.
  return new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short' }).format(instant);
}
