const day = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});

/** A calendar date such as `2026-08-01` as it stands on a drawing, in whatever zone it is read: `1 Aug 2026`. */
export const sayCutDay = (date: string): string => day.format(new Date(`${date}T00:00:00Z`));
