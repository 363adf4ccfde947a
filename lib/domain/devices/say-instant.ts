/** "20 Nov, 10:00" on the site's own clock. */
export const sayInstant = (iso: string, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { timeZone, day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit' }).format(new Date(iso));
