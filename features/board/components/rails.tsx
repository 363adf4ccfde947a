'use client';

import { useState } from 'react';
import { useSettings } from './board-context';
import { NotOffered } from './not-offered';
import { useOpened } from './opened';
import { RailRow } from './rail-row';
import { Tray } from './tray';

/** With more stations than this the rails begin folded to one line each. */
const foldOver = 12;

const quietButton = 'min-h-8 px-1 text-[13px] font-semibold underline underline-offset-3';

export function Rails() {
  const { stations } = useSettings();
  const { open } = useOpened();
  const [folded, setFolded] = useState(stations.length > foldOver);
  return (
    <>
      <Tray />
      {stations.map((station) => <RailRow key={station.id} station={station} folded={folded} />)}
      {stations.length === 0 ? <p className="py-8 text-[15px]">No station yet. A station is where work is done, such as Grill or Bar. Add the first on the Stations page; its rail appears here.</p> : null}
      <div className="flex flex-wrap gap-x-5">
        {stations.length < 2 ? null : (
          <button type="button" aria-pressed={folded} className={quietButton} onClick={() => setFolded(!folded)}>{folded ? 'Unfold rails' : 'Fold rails'}</button>
        )}
        <button type="button" className={quietButton} onClick={() => open({ kind: 'rules' })}>All rules in order</button>
      </div>
      <NotOffered />
    </>
  );
}
