import { dependentsOfPrinter, type Dependents } from '@/lib/domain/checks/dependents';
import type { DraftSite } from '@/lib/domain/checks/check-draft';
import { compileReach } from '@/lib/domain/reach/compile-reach';
import { may, type Membership } from '@/lib/domain/roles/permissions';
import type { Printer } from '@/lib/domain/site/printer';
import type { SharedPoint, Site } from '@/lib/domain/site/site';

/** One till beside a printer: whether it can print there, and whether it has. */
export type TillTest = {
  readonly till: string;
  readonly name: string;
  readonly installed: boolean;
  readonly reaches: boolean;
  /** The sentence that says how it is known. */
  readonly why: string;
  readonly testPrintedAt: string | null;
};

/** Everything the panel of one printer needs, as plain data; `printer` is null for one that is being added. */
export type PanelView = {
  readonly siteId: string;
  readonly timeZone: string;
  readonly site: DraftSite;
  readonly sharedPoints: readonly SharedPoint[];
  readonly printer: Printer | null;
  readonly tests: readonly TillTest[];
  readonly dependents: Dependents;
  readonly mayWrite: boolean;
  readonly mayMarkDown: boolean;
  readonly maySetBackup: boolean;
  readonly mayTest: boolean;
};

const testsOf = (site: Site, printer: Printer): readonly TillTest[] => {
  const reach = compileReach(site);
  return site.tills.filter((till) => till.kind !== 'online').map((till) => {
    const queue = till.queues.find((one) => one.printer === printer.id);
    const { reaches, why } = reach(till.id, printer.id);
    return { till: till.id, name: till.name, installed: queue !== undefined, reaches, why, testPrintedAt: queue?.testPrintedAt ?? null };
  });
};

export const panelView = (site: Site, membership: Membership, printer: Printer | null): PanelView => ({
  siteId: site.id,
  timeZone: site.timeZone,
  site: { network: site.network, namingPolicy: site.namingPolicy, link: site.link, tills: site.tills, printers: site.printers, stations: site.stations },
  sharedPoints: site.sharedPoints,
  printer,
  tests: printer === null ? [] : testsOf(site, printer),
  dependents: printer === null ? { obstacles: [], consequences: [] } : dependentsOfPrinter(site, printer.id),
  mayWrite: may(membership, 'printer.write'),
  maySetBackup: may(membership, 'printer.set-backup'),
  mayMarkDown: may(membership, 'printer.mark-down'),
  mayTest: may(membership, 'printer.test'),
});
