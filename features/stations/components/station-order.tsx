'use client';

import { usePathname, useRouter } from 'next/navigation';
import { useState, useTransition, type KeyboardEvent } from 'react';
import { Button } from '@/components/button';
import { SidePanel } from '@/components/side-panel';
import { Stamp } from '@/components/stamp';
import type { Station } from '@/lib/domain/site/station';
import { ProblemError } from '@/lib/http/client';
import { placeStations } from '../api/stations';

/** Puts the stations in the order the kitchen is walked; the board's rails and the tickets follow it. */
export function StationOrder({ siteId, stations }: { readonly siteId: string; readonly stations: readonly Station[] }) {
  const router = useRouter();
  const pathname = usePathname();
  const [order, setOrder] = useState(stations);
  const [said, setSaid] = useState('');
  const [refused, setRefused] = useState('');
  const [busy, startTransition] = useTransition();
  const leave = (): void => router.push(pathname, { scroll: false });
  const move = (station: Station, to: number): void => {
    if (to < 0 || to >= order.length) return;
    setOrder(order.filter((one) => one !== station).toSpliced(to, 0, station));
    setSaid(`${station.name} is number ${to + 1} of ${order.length}.`);
  };
  const onKeyDown = (station: Station, index: number) => (event: KeyboardEvent): void => {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    move(station, index + (event.key === 'ArrowUp' ? -1 : 1));
  };
  const save = (): void => startTransition(async () => {
    try {
      await placeStations(siteId, order.map((station) => station.id));
      leave();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
    }
    router.refresh();
  });
  return (
    <SidePanel title="Put the stations in order" close={leave}>
      <p className="mb-3 text-[13px] text-soft">The rails of the board hang in this order, and tickets that leave one printer follow it. Alt with the arrow keys moves a station too.</p>
      <ol className="grid gap-1.5">
        {order.map((station, index) => (
          <li key={station.id} onKeyDown={onKeyDown(station, index)} className="flex items-center gap-2.5 rounded-md border border-line bg-raised px-2.5 py-1.5">
            <span className="w-4 text-right text-quiet">{index + 1}</span>
            <Stamp code={station.code} mesh={station.mesh} colour={station.colour} size="small" /><b className="min-w-0 flex-1">{station.name}</b>
            <Button aria-disabled={index === 0} className="aria-disabled:opacity-40" onClick={() => move(station, index - 1)} aria-label={`Move ${station.name} up`}>Up</Button>
            <Button aria-disabled={index === order.length - 1} className="aria-disabled:opacity-40" onClick={() => move(station, index + 1)} aria-label={`Move ${station.name} down`}>Down</Button>
          </li>
        ))}
      </ol>
      <p role="status" className="sr-only">{said}</p>
      <p role="alert" className="mt-3 text-[13.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
      <div className="sticky bottom-0 mt-4 flex gap-2 border-t border-line bg-panel py-3">
        <Button kind="primary" disabled={busy} onClick={save}>Save this order</Button>
        <Button onClick={leave}>Cancel</Button>
      </div>
    </SidePanel>
  );
}
