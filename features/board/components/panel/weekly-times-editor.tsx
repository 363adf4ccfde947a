'use client';

import { useState } from 'react';
import type { WeeklyTime } from '@/lib/domain/site/plan';
import { setWeeklyTimes } from '../../api/change-plans';
import type { PlanTab } from '../../board-view';
import { sayWeekday, weekdays } from '../../weekly-words';
import { useSettings } from '../board-context';

type WeeklyTimesEditorProps = { readonly plan: PlanTab; readonly change: (work: () => Promise<unknown>) => Promise<boolean> };

const inOrder = (times: readonly WeeklyTime[]): readonly WeeklyTime[] =>
  times.toSorted((left, right) => left.weekday - right.weekday || left.start.localeCompare(right.start));

const allDays = weekdays.map((_, day) => day + 1);

/** One time of day with a tick for each weekday. */
function StartRow({ name, start, days, tick }: { readonly name: string; readonly start: string; readonly days: readonly number[]; readonly tick: (day: number, on: boolean) => void }) {
  return (
    <li className="flex flex-wrap items-center gap-x-2 gap-y-1">
      <b className="w-12 font-[640] tabular-nums">{start}</b>
      {allDays.map((day) => (
        <label key={day} className="flex min-h-7 items-center gap-1 rounded-md border border-line-strong px-1.5 has-checked:border-ink has-checked:bg-ink has-checked:text-on-ink">
          <input
            type="checkbox"
            className="size-3.5 accent-current"
            aria-label={`${name} at ${start} on ${sayWeekday(day)}`}
            checked={days.includes(day)}
            onChange={(event) => tick(day, event.target.checked)}
          />
          <span aria-hidden>{sayWeekday(day).slice(0, 2)}</span>
        </label>
      ))}
    </li>
  );
}

/** When a plan goes live by itself: each time of day with its weekdays. Saved with each tick. */
export function WeeklyTimesEditor({ plan, change }: WeeklyTimesEditorProps) {
  const { siteId } = useSettings();
  const [start, setStart] = useState('17:00');
  const save = (times: readonly WeeklyTime[]): void => void change(() => setWeeklyTimes(siteId, plan.id, inOrder(times), plan.weeklyTimes));
  const starts = [...new Set(plan.weeklyTimes.map((time) => time.start))].toSorted();
  const tick = (at: string) => (day: number, on: boolean): void => save(on
    ? [...plan.weeklyTimes, { weekday: day, start: at }]
    : plan.weeklyTimes.filter((time) => time.weekday !== day || time.start !== at));
  return (
    <fieldset className="grid gap-1.5 text-[13px]">
      <legend className="text-[12.5px] font-semibold text-soft">Goes live by itself</legend>
      {starts.length === 0 ? <p className="text-quiet">Never: it is put live by hand.</p> : (
        <ul className="grid gap-1.5">
          {starts.map((at) => (
            <StartRow key={at} name={plan.name} start={at} days={plan.weeklyTimes.filter((time) => time.start === at).map((time) => time.weekday)} tick={tick(at)} />
          ))}
        </ul>
      )}
      <div className="flex flex-wrap items-center gap-2">
        <input
          aria-label={`Another time for ${plan.name}`}
          type="time"
          className="min-h-8 rounded-md border border-line-strong bg-raised px-2 text-[13px]"
          value={start}
          onChange={(event) => setStart(event.target.value)}
        />
        <button
          type="button"
          disabled={start === '' || starts.includes(start)}
          className="min-h-6 font-semibold underline underline-offset-3 disabled:text-quiet disabled:no-underline"
          onClick={() => save([...plan.weeklyTimes, ...allDays.map((weekday) => ({ weekday, start }))])}
        >
          Add for every day
        </button>
      </div>
    </fieldset>
  );
}
