'use client';

import { useState } from 'react';
import type { WeeklyTime } from '@/lib/domain/site/plan';
import { setWeeklyTimes } from '../../api/change-plans';
import type { PlanTab } from '../../board-view';
import { sayWeekday, sayWeeklyTime, weekdays } from '../../weekly-words';
import { useSettings } from '../board-context';

type WeeklyTimesEditorProps = { readonly plan: PlanTab; readonly change: (work: () => Promise<unknown>) => Promise<boolean> };

const field = 'min-h-8 rounded-md border border-line-strong bg-raised px-2 text-[13px]';

const inOrder = (times: readonly WeeklyTime[]): readonly WeeklyTime[] =>
  times.toSorted((left, right) => left.weekday - right.weekday || left.start.localeCompare(right.start));

/** "every day" adds all seven at once, the most common wish. */
const everyDay = 0;

/** When a plan goes live by itself, as a list to add to and take from. */
export function WeeklyTimesEditor({ plan, change }: WeeklyTimesEditorProps) {
  const { siteId } = useSettings();
  const [weekday, setWeekday] = useState(everyDay);
  const [start, setStart] = useState('17:00');
  const save = (times: readonly WeeklyTime[]): void => void change(() => setWeeklyTimes(siteId, plan.id, inOrder(times), plan.weeklyTimes));
  const added = weekday === everyDay ? weekdays.map((_, day) => ({ weekday: day + 1, start })) : [{ weekday, start }];
  return (
    <fieldset className="grid gap-1.5 text-[13px]">
      <legend className="text-[12.5px] font-semibold text-soft">Goes live by itself</legend>
      {plan.weeklyTimes.length === 0 ? <p className="text-quiet">Never: it is put live by hand.</p> : (
        <ul className="flex flex-wrap gap-x-4 gap-y-1">
          {inOrder(plan.weeklyTimes).map((time) => (
            <li key={sayWeeklyTime(time)} className="flex items-center gap-1.5">
              {sayWeeklyTime(time)}
              <button
                type="button"
                aria-label={`${plan.name} no longer on ${sayWeeklyTime(time)}`}
                className="min-h-6 font-semibold underline underline-offset-3"
                onClick={() => save(plan.weeklyTimes.filter((other) => other !== time))}
              >
                Remove
              </button>
            </li>
          ))}
        </ul>
      )}
      <div className="flex flex-wrap items-center gap-2">
        <select aria-label={`Weekday for ${plan.name}`} className={field} value={weekday} onChange={(event) => setWeekday(Number(event.target.value))}>
          <option value={everyDay}>every day</option>
          {weekdays.map((name, day) => <option key={name} value={day + 1}>{sayWeekday(day + 1)}</option>)}
        </select>
        <input aria-label={`Time for ${plan.name}`} type="time" required className={field} value={start} onChange={(event) => setStart(event.target.value)} />
        <button type="button" disabled={start === ''} className="min-h-6 font-semibold underline underline-offset-3" onClick={() => save([...plan.weeklyTimes, ...added])}>Add</button>
      </div>
    </fieldset>
  );
}
