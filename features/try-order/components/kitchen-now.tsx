'use client';

import type { PrinterId, StationId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import type { Present } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';
import type { PlanChoice } from '../plan-choices';
import styles from './try-order.module.css';

type KitchenNowProps = {
  readonly site: Site;
  readonly choices: readonly PlanChoice[];
  readonly plan: Plan;
  readonly present: Present;
  readonly change: (now: { readonly plan: Plan; readonly present: Present }) => void;
};

const toggled = <Id extends string>(ids: readonly Id[], id: Id, on: boolean): readonly Id[] => (on ? [...ids, id] : ids.filter((one) => one !== id));

/** The kitchen from here on: the plan that is live, stations that close, printers that stop. Earlier events keep theirs. */
export function KitchenNow({ site, choices, plan, present, change }: KitchenNowProps) {
  const close = (id: StationId, on: boolean): void => change({ plan, present: { ...present, closedStations: toggled(present.closedStations, id, on) } });
  const stop = (id: PrinterId, on: boolean): void => change({ plan, present: { ...present, downPrinters: toggled(present.downPrinters, id, on) } });
  return (
    <details className={styles['instead']}>
      <summary>Change the kitchen{present.closedStations.length + present.downPrinters.length === 0 ? '' : `: ${present.closedStations.length} closed, ${present.downPrinters.length} down`}</summary>
      <label className={styles['field']}><span>Plan from here on</span>
        <select value={choices.find((choice) => choice.plan === plan)?.key ?? choices[0]?.key} onChange={(event) => { const chosen = choices.find((choice) => choice.key === event.target.value); if (chosen !== undefined) change({ plan: chosen.plan, present }); }}>
          {choices.map((choice) => <option key={choice.key} value={choice.key}>{choice.words}</option>)}
        </select>
      </label>
      <fieldset className={styles['options']}>
        <legend>Closed stations</legend>
        {site.stations.map(({ id, name }) => <label key={id}><input type="checkbox" checked={present.closedStations.includes(id)} onChange={(event) => close(id, event.target.checked)} /> {name}</label>)}
      </fieldset>
      <fieldset className={styles['options']}>
        <legend>Printers that stopped</legend>
        {site.printers.map(({ id, name }) => <label key={id}><input type="checkbox" checked={present.downPrinters.includes(id)} onChange={(event) => stop(id, event.target.checked)} /> {name}</label>)}
      </fieldset>
    </details>
  );
}
