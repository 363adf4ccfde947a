import { printerAddressFindings } from '../addresses/printer-findings';
import { tillAddressFindings } from '../addresses/till-findings';
import { bySeverity, type Finding } from '../findings/finding';
import { checkPrinterName } from '../names/check-printer-name';
import { nameContextOf } from '../names/name-context';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Till } from '../site/till';
import { circleFinding, hostFinding } from './device-set-up-findings';
import { defaultPrinterFinding, queueFindings } from './queue-findings';

/** What a form needs of a site to check what is typed into it. */
export type DraftSite = Pick<Site, 'network' | 'namingPolicy' | 'link' | 'tills' | 'printers' | 'stations'>;

const withItem = <Row extends { readonly id: string }>(rows: readonly Row[], row: Row): readonly Row[] => [...rows.filter((one) => one.id !== row.id), row];

/**
 * What there is to say of a printer while it is being typed; every finding names its field. Whatever it shares with
 * another device is its own to change.
 */
export const checkPrinterDraft = (site: DraftSite, draft: Printer): readonly Finding[] => {
  const within = { ...site, printers: withItem(site.printers, draft) };
  return bySeverity([
    ...checkPrinterName(draft.name, nameContextOf(within, draft, true)),
    ...printerAddressFindings(within, draft, { yields: true }),
    ...hostFinding(within, draft),
  ]);
};

/** The same for a till; a finding about a queue names it as `queues.2.typedName`. */
export const checkTillDraft = (site: DraftSite, draft: Till): readonly Finding[] => {
  const within = { ...site, tills: withItem(site.tills, draft) };
  return bySeverity([
    ...tillAddressFindings(within, draft, { yields: true }),
    ...circleFinding(within, draft),
    ...queueFindings(within, draft),
    ...defaultPrinterFinding(within, draft),
  ]);
};
