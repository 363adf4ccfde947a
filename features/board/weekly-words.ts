import type { WeeklyTime } from '@/lib/domain/site/plan';

export const weekdays = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'] as const;

/** ISO weekday, 1 Monday to 7 Sunday. */
export const sayWeekday = (weekday: number): string => weekdays[weekday - 1] ?? 'some day';

/** "Monday 17:30". */
export const sayWeeklyTime = (time: WeeklyTime): string => `${sayWeekday(time.weekday)} ${time.start}`;
