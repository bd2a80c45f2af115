const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** A day as it stands on a drawing: `12 Oct 2026`, in the reader's own time zone. */
export const sayDay = (iso: string): string => day.format(new Date(iso));
