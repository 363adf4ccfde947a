/** "19:42" on a site's own clock. */
export const timeOn = (timeZone: string, at: Date): string =>
  new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' }).format(at);
