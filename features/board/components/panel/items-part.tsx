'use client';

import { useMemo } from 'react';
import { sayStations } from '@/lib/domain/plans/card-notes';
import { unconditionalWinners } from '@/lib/domain/plans/hanging';
import type { SectionId, StationId } from '@/lib/domain/site/ids';
import { anyCondition } from '@/lib/domain/site/plan';
import { useBoard, useSettings, useStore } from '../board-context';
import { useMakeEdit } from '../use-make-edit';
import { PanelPart } from './panel-part';

const asSection = '';

/** The section's items; one that cooks elsewhere is sent there by its own rule. */
export function ItemsPart({ section }: { readonly section: SectionId }) {
  const { site } = useStore();
  const { stations, mayWrite } = useSettings();
  const content = useBoard((state) => state.content);
  const make = useMakeEdit();
  const winners = useMemo(() => unconditionalWinners(site, content), [site, content]);
  const items = site.menu.items.filter((item) => item.section === section);

  const send = (item: (typeof items)[number], station: string): void => {
    const target = { kind: 'item', item: item.id } as const;
    if (station === asSection) make({ kind: 'take-off', targets: [target] }, `${item.name} goes with its section again`);
    else make({ kind: 'send', targets: [target], conditions: anyCondition, how: 'replace', stations: [station as StationId] }, `${item.name} now prints at ${sayStations(site, [station])}`);
  };

  return (
    <PanelPart title="Items">
      <ul className="grid gap-px overflow-hidden rounded-md border border-line bg-line">
        {items.map((item) => {
          const winner = winners.get(item.id);
          const own = winner?.target.kind === 'item' ? winner : null;
          const several = own !== null && own.stations.length > 1;
          return (
            <li key={item.id} className="flex items-center gap-3 bg-raised px-3 py-1">
              <span className="min-w-0 flex-1 py-1">{item.name}</span>
              {item.noTicket ? <span className="text-[12.5px] text-quiet">no ticket</span> : (
                <select
                  aria-label={`${item.name} prints at`}
                  disabled={!mayWrite}
                  className={`min-h-8 max-w-[150px] rounded-md border border-transparent bg-transparent px-1 text-[13px] hover:border-line-strong ${own === null ? 'text-quiet' : 'font-semibold'}`}
                  value={own === null ? asSection : several ? 'several' : own.stations[0]}
                  onChange={(event) => send(item, event.target.value)}
                >
                  <option value={asSection}>with its section</option>
                  {several ? <option value="several">{sayStations(site, own.stations)}</option> : null}
                  {stations.filter((station) => station.kind === 'prep').map((station) => <option key={station.id} value={station.id}>{station.name}</option>)}
                </select>
              )}
            </li>
          );
        })}
      </ul>
      {items.length === 0 ? <p className="text-[13px] text-quiet">No items yet. They are added on the Menu page.</p> : null}
    </PanelPart>
  );
}
