'use client';

import { Stamp } from '@/components/stamp';
import type { LineRoute, StationRoute } from '@/lib/domain/routing/route-line';
import { namesOf } from '@/lib/domain/routing/names-of';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';

type Leg = { readonly key: string; readonly what: string; readonly route: StationRoute; readonly copy: boolean };

const legsOf = (route: LineRoute, site: Site): readonly Leg[] => {
  const names = namesOf(site);
  return [
    ...route.cook.routes.map((one): Leg => ({ key: `cook ${one.asked}`, what: names.item(route.item), route: one, copy: false })),
    ...route.splits.flatMap((split) => split.routes
      .filter(({ reached }) => reached === null || !split.withDish.includes(reached))
      .map((one): Leg => ({ key: `split ${split.option} ${one.asked}`, what: names.option(split.option), route: one, copy: false }))),
    ...route.copies.map((one): Leg => ({ key: `copy ${one.asked}`, what: 'Copy', route: one, copy: true })),
  ];
};

/** The way of one line as a small picture: what, which station, which printer; a broken end is said and marked. */
export function LinePath({ route, site }: { readonly route: LineRoute; readonly site: Site }) {
  const names = namesOf(site);
  return (
    <ul className={styles['path']} aria-label="Its way">
      {legsOf(route, site).map(({ key, what, route: { asked, reached, printer }, copy }) => {
        const station = site.stations.find(({ id }) => id === (reached ?? asked));
        return (
          <li key={key} className={printer === null ? styles['broken'] : copy ? styles['copyLeg'] : undefined}>
            <span>{what}</span>
            <i className={styles['wire']} aria-hidden="true" />
            {station === undefined ? null : <Stamp code={station.code} mesh={station.mesh} colour={station.colour} size="small" />}
            <span>{station?.name ?? 'Unknown station'}</span>
            <i className={styles['wire']} aria-hidden="true" />
            {printer === null ? <b>{reached === null ? 'closed' : 'no printer'}</b> : <code>{names.printer(printer)}</code>}
          </li>
        );
      })}
    </ul>
  );
}
