import type { Site } from '@/lib/domain/site/site';
import { kitchenNameOf } from '@/lib/domain/site/menu';
import type { Played } from './play-events';
import type { Tab } from '@/lib/domain/orders/tab';

/** The item of a tab's line, as people call it. */
export const lineName = (site: Site, tab: Tab, line: number): string => site.menu.items.find((item) => item.id === tab.lines[line]?.line.item)?.name ?? 'a line';

/** What was done, in one sentence. */
export const sayEvent = (site: Site, { event }: Played, tab: Tab): string => {
  const course = (id: string | null): string => site.courses.find((one) => one.id === id)?.name ?? 'Everything held';
  switch (event.kind) {
    case 'add': return `${event.lines.length === 1 ? 'One line' : `${event.lines.length} lines`} added`;
    case 'fire': return `${course(event.course)} away`;
    case 'amend': return `${lineName(site, tab, event.line)} amended${event.allergies === undefined ? '' : `: ${event.allergies.join(', ')}`}`;
    case 'void': return `${event.quantity} ${lineName(site, tab, event.line)} taken off`;
    case 'move': return `Moved to table ${event.table}`;
    case 'merge': return `Table ${event.other.table} joined`;
    case 'rush': return 'Rushed';
    case 'reprint': return 'Printed again';
    case 'remake': return `${lineName(site, tab, event.line)} made again`;
    case 'message': return `Message to ${site.stations.find((station) => station.id === event.station)?.name ?? 'a station'}: ${event.words}`;
  }
};

/** What of an event printed nowhere, in words. */
export const sayLosses = (site: Site, { printed, tab }: { readonly printed: { readonly losses: readonly { readonly sourceLine: number; readonly option: string | null; readonly station: string | null }[] }; readonly tab: Tab }): readonly string[] =>
  printed.losses.map((loss) => {
    const option = site.menu.options.find((one) => one.id === loss.option);
    const what = option === undefined ? lineName(site, tab, loss.sourceLine) : kitchenNameOf(option);
    return `${what} is not told to ${site.stations.find((station) => station.id === loss.station)?.name ?? 'anybody'}: nobody prints there. Tell them by voice.`;
  });
