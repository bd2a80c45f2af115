const moment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
});

/** Day and time in the reader's own time zone: `12 Oct 2026, 19:05`. */
export const sayMoment = (iso: string): string => moment.format(new Date(iso));
