import { checkSite } from '@/lib/domain/checks/check-site';
import { countBySeverity, type Finding } from '@/lib/domain/findings/finding';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';

/** One line of the table, with what is wrong with that printer. */
export type PrinterRow = {
  readonly printer: Printer;
  readonly stations: readonly string[];
  readonly backup: string | null;
  /** How many of the tills that have it have printed a test. */
  readonly tested: number;
  readonly installed: number;
  readonly findings: readonly Finding[];
};

export type PrintersOverview = {
  readonly verdict: string;
  readonly said: string;
  readonly rows: readonly PrinterRow[];
  /** About the network as a whole. */
  readonly siteFindings: readonly Finding[];
};

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

const verdictOf = (findings: readonly Finding[], printers: number): string => {
  const { stop, check } = countBySeverity(findings);
  if (printers === 0) return 'No printers yet';
  if (stop === 0 && check === 0) return printers === 1 ? 'The printer is well' : `All ${printers} printers are well`;
  return [...(stop === 0 ? [] : [`${stop} to fix`]), ...(check === 0 ? [] : [`${check} to look at`])].join(', ');
};

/** The printers of a site with their findings; those with something to fix first, else in the site's order. */
export const printersOverview = (site: Site): PrintersOverview => {
  const live = site.plans.find((plan) => plan.id === site.live?.planId) ?? site.plans[0];
  const found = checkSite(site, live);
  const queuesOf = (printer: Printer) => site.tills.flatMap((till) => till.queues.filter((queue) => queue.printer === printer.id));
  const rows = site.printers.map((printer): PrinterRow => ({
    printer,
    stations: site.stations.filter((station) => station.printers.includes(printer.id)).map((station) => station.name),
    backup: site.printers.find((one) => one.id === printer.backup)?.name ?? null,
    tested: queuesOf(printer).filter((queue) => queue.testPrintedAt !== null).length,
    installed: queuesOf(printer).length,
    findings: found.filter((finding) => (finding.subject.kind === 'printer' || finding.subject.kind === 'queue') && finding.subject.id === printer.id),
  }));
  const siteFindings = found.filter((finding) => finding.subject.kind === 'site');
  const networked = site.printers.filter((printer) => printer.connection === 'network').length;
  const down = site.printers.filter((printer) => printer.downSince !== null).length;
  const worst = (row: PrinterRow): number => (row.findings.some((finding) => finding.severity === 'stop') ? 0 : row.findings.length > 0 ? 1 : 2);
  return {
    verdict: verdictOf([...siteFindings, ...rows.flatMap((row) => row.findings)], rows.length),
    said: [
      `${counted(rows.length, 'printer', 'printers')}, ${networked} on the network`,
      ...(down === 0 ? [] : [`${down} down`]),
    ].join(', ').concat('.'),
    rows: rows.toSorted((left, right) => worst(left) - worst(right)),
    siteFindings,
  };
};
