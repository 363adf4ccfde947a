import { networkFindings } from '../addresses/network-findings';
import { printerAddressFindings } from '../addresses/printer-findings';
import { tillAddressFindings } from '../addresses/till-findings';
import { bySeverity, type Finding } from '../findings/finding';
import { checkPrinterName } from '../names/check-printer-name';
import { nameContextOf } from '../names/name-context';
import type { WayClass } from '../proof/way';
import type { PlanContent } from '../site/plan';
import type { Site } from '../site/site';
import { circleFinding, hostFinding, testFinding } from './device-set-up-findings';
import { missingQueueFindings } from './missing-queue-findings';
import { defaultPrinterFinding, queueFindings } from './queue-findings';

/** Addresses that findings offer, so that the next device is offered another. */
const offered = (findings: readonly Finding[]): readonly string[] =>
  findings.flatMap((finding) => finding.fixes.flatMap((fix) => (fix.kind === 'set-printer-address' || fix.kind === 'set-till-address' ? [fix.address] : [])));

const addressFindings = (site: Site): readonly Finding[] => {
  const found: Finding[] = [...networkFindings(site)];
  for (const printer of site.printers) found.push(...printerAddressFindings(site, printer, { promised: offered(found) }));
  for (const till of site.tills) found.push(...tillAddressFindings(site, till, { promised: offered(found) }));
  return found;
};

/**
 * Every finding about names, addresses, queues and tests of a site, worst first.
 *
 * @param plan when given, also the queues that this plan needs and a till does not have
 * @param classes the plan's ways to order, when the caller has tried them already
 */
export const checkSite = (site: Site, plan?: PlanContent, classes?: readonly WayClass[]): readonly Finding[] => bySeverity([
  ...site.printers.flatMap((printer) => checkPrinterName(printer.name, nameContextOf(site, printer))),
  ...addressFindings(site),
  ...site.printers.flatMap((printer) => hostFinding(site, printer)),
  ...site.tills.flatMap((till) => [...circleFinding(site, till), ...queueFindings(site, till), ...defaultPrinterFinding(site, till)]),
  ...(plan === undefined ? [] : missingQueueFindings(site, plan, classes)),
  ...site.printers.flatMap((printer) => testFinding(site, printer)),
]);
