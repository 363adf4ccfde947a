'use client';

import { Stamp } from '@/components/stamp';
import type { StationId } from '@/lib/domain/site/ids';
import type { RailStation } from './rail-station';

type StationRowsProps = {
  readonly legend: string;
  readonly stations: readonly RailStation[];
  readonly ticked: readonly StationId[];
  readonly change: (station: StationId, ticked: boolean) => void;
  /** With it each name is a button that sends to this station alone. */
  readonly only?: (station: StationId) => void;
};

/** Stations to tick, several at once; each by its stamp and name. */
export function StationRows({ legend, stations, ticked, change, only }: StationRowsProps) {
  return (
    <fieldset>
      <legend className="mb-1 text-[12.5px] font-semibold text-soft">{legend}</legend>
      <ul className="grid gap-0.5">
        {stations.map((station) => {
          const isTicked = ticked.includes(station.id);
          const name = (
            <>
              <Stamp code={station.code} mesh={station.mesh} colour={station.colour} size="small" />
              <span className="font-semibold">{station.name}</span>
            </>
          );
          return (
            <li key={station.id} className="flex items-center gap-2">
              {only === undefined ? null : (
                <button type="button" className="flex min-h-9 flex-1 items-center gap-2.5 rounded-md px-2 text-left hover:bg-ground focus-visible:bg-ground" onClick={() => only(station.id)}>
                  {name}
                  {isTicked ? <span className="ml-auto text-[12px] text-quiet">hangs here</span> : null}
                </button>
              )}
              <label className={`flex min-h-9 items-center gap-2.5 rounded-md px-2 hover:bg-ground ${only === undefined ? 'flex-1' : ''}`}>
                {only === undefined ? name : null}
                <input
                  type="checkbox"
                  className="ml-auto size-4.5 accent-ink"
                  checked={isTicked}
                  aria-label={only === undefined ? station.name : `${station.name} as well`}
                  onChange={(event) => change(station.id, event.target.checked)}
                />
              </label>
            </li>
          );
        })}
      </ul>
    </fieldset>
  );
}
