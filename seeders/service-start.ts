import { Temporal } from '@js-temporal/polyfill';

/** The last time, at or before `now`, that the site's clock showed this wall-clock time. */
export const lastStart = (now: Date, start: string, timeZone: string): Date => {
  const here = Temporal.Instant.fromEpochMilliseconds(now.getTime()).toZonedDateTimeISO(timeZone);
  const today = here.withPlainTime(Temporal.PlainTime.from(start));
  const at = Temporal.ZonedDateTime.compare(today, here) <= 0 ? today : here.subtract({ days: 1 }).withPlainTime(Temporal.PlainTime.from(start));
  return new Date(at.epochMilliseconds);
};
