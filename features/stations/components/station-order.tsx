'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/button';
import { SidePanel } from '@/components/side-panel';
import { Stamp } from '@/components/stamp';
import type { Station } from '@/lib/domain/site/station';
import { placeStations } from '../api/stations';

/** Puts the stations in the order the kitchen is walked; the board and the tickets follow it. */
export function StationOrder({ siteId, stations }: { readonly siteId: string; readonly stations: readonly Station[] }) {
  const router = useRouter();
  const pathname = usePathname();
  const [order, setOrder] = useState(stations);
  const [refused, setRefused] = useState('');
  const close = (): void => router.push(pathname, { scroll: false });
  const move = (index: number, to: number): void => {
    const moved = order[index];
    if (moved !== undefined && to >= 0 && to < order.length) setOrder(order.filter((one) => one !== moved).toSpliced(to, 0, moved));
  };
  const save = (): void => {
    placeStations(siteId, order.map((station) => station.id)).then(() => { close(); router.refresh(); }, (error: unknown) => setRefused((error as Error).message));
  };
  return (
    <SidePanel title="Put in order" close={close}>
      <ol className="grid gap-1.5">
        {order.map((station, index) => (
          <li
            key={station.id} className="flex items-center gap-2.5 rounded-md border border-line bg-raised px-2.5 py-1.5"
            onKeyDown={(event) => { if (event.altKey && event.key === 'ArrowUp') move(index, index - 1); if (event.altKey && event.key === 'ArrowDown') move(index, index + 1); }}
          >
            <Stamp code={station.code} mesh={station.mesh} colour={station.colour} size="small" /><b className="flex-1">{station.name}</b>
            <Button disabled={index === 0} onClick={() => move(index, index - 1)} aria-label={`Move ${station.name} up`}>Up</Button>
            <Button disabled={index === order.length - 1} onClick={() => move(index, index + 1)} aria-label={`Move ${station.name} down`}>Down</Button>
          </li>
        ))}
      </ol>
      <p role="alert" className="mt-3 font-semibold text-hot-text empty:hidden">{refused}</p>
      <div className="mt-4 flex gap-2"><Button kind="primary" onClick={save}>Save this order</Button><Button onClick={close}>Cancel</Button></div>
    </SidePanel>
  );
}
