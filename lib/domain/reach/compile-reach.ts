import { maskOf } from '../addresses/masks';
import { readSubnet, type Subnet } from '../addresses/subnet';
import type { PrinterId, TillId } from '../site/ids';
import type { Printer } from '../site/printer';
import type { Site } from '../site/site';
import type { Till } from '../site/till';
import { measuredReach, measurementsOf } from './measured';
import type { Reach, ReachOptions } from './reach';
import { findSender, type Sender } from './senders';
import { brokenBetween, endpointOf, endpointSomewhere, sayBroken, type EndpointResult } from './work-out';

export type ReachSite = Pick<Site, 'tills' | 'printers' | 'link' | 'network'>;

/** Asks for one pair; answers are kept, so a whole matrix costs each pair once. */
export type AskReach = (till: TillId, printer: PrinterId) => Reach;

type Line = { readonly sender: Sender; readonly end: EndpointResult; readonly assumed: boolean };

const workedOut = (reaches: boolean, why: string, more: Partial<Reach> = {}): Reach => ({
  reaches, strength: 'worked-out', measuredAt: null, why, broken: null, via: null, assumed: false, ...more,
});

/** The sending end of a till's line; a till whose address the router gives counts as in the site's subnet. */
const lineOf = (sender: Sender, subnet: Subnet | null): Line => {
  if (sender.kind === 'none') return { sender, end: { ok: false, why: sender.why }, assumed: false };
  if (sender.kind === 'link') return { sender, end: endpointOf('The print link', sender.address, sender.mask), assumed: false };
  const { till } = sender;
  if (till.addressSource === 'static') return { sender, end: endpointOf(till.name, till.address, till.mask), assumed: false };
  if (till.address !== '') return { sender, end: endpointOf(till.name, till.address, till.mask === '' && subnet !== null ? maskOf(subnet.prefix) : till.mask), assumed: false };
  if (subnet === null) return { sender, end: { ok: false, why: `${till.name} gets its address from the router, and nobody has said which network that is.` }, assumed: false };
  return { sender, end: { ok: true, value: endpointSomewhere(till.name, subnet, maskOf(subnet.prefix)) }, assumed: true };
};

const overTheNetwork = (line: Line, printer: Printer, end: EndpointResult, siteMask: string | null): Reach => {
  const via = line.sender.kind === 'till' ? line.sender.via : null;
  if (!line.end.ok) return workedOut(false, line.end.why, { via });
  if (!end.ok) return workedOut(false, end.why, { via });
  const broken = brokenBetween(line.end.value, end.value);
  if (broken !== null) return workedOut(false, sayBroken(broken, line.end.value, end.value, siteMask), { broken, via, assumed: line.assumed });
  const why = line.assumed
    ? `${line.end.value.name} gets its address from the router and counts as in the site's network, where ${printer.name} is.`
    : `${line.end.value.name} and ${printer.name} are in the same network.`;
  return workedOut(true, why, { via, assumed: line.assumed });
};

const overItsCable = (line: Line, printer: Printer, hostTill: Till | undefined): Reach => {
  if (line.sender.kind === 'none') return workedOut(false, line.sender.why);
  if (hostTill === undefined) return workedOut(false, `${printer.name} is not on the network, and nobody has said which till it is plugged into.`);
  const via = line.sender.kind === 'till' ? line.sender.via : null;
  return line.sender.kind === 'till' && line.sender.till.id === hostTill.id
    ? workedOut(true, `${printer.name} is plugged into ${hostTill.name}.`, { via })
    : workedOut(false, `${printer.name} is plugged into ${hostTill.name} and prints only from there.`, { via });
};

/**
 * Who reaches what on a site. What was measured wins over what was worked out, unless the way it took leads
 * through a till that is off. An unknown till or printer is not reached.
 */
export const compileReach = (site: ReachSite, options: ReachOptions = {}): AskReach => {
  const off = new Set(options.offTills ?? []);
  const subnet = readSubnet(site.network.subnet);
  const siteMask = subnet === null ? null : maskOf(subnet.prefix);
  const tills = new Map(site.tills.map((till) => [till.id, till]));
  const lines = new Map(site.tills.map((till) => [till.id, lineOf(findSender(site, till, off), subnet)]));
  const printers = new Map(site.printers.map((printer) => [printer.id, { printer, end: endpointOf(printer.name, printer.address, printer.mask) }]));
  const measurements = measurementsOf(site, options.answers ?? []);
  const known = new Map<TillId, Map<PrinterId, Reach>>();

  const ask: AskReach = (tillId, printerId) => {
    const line = lines.get(tillId);
    const there = printers.get(printerId);
    if (line === undefined || there === undefined) return workedOut(false, 'This till or printer is no longer on the site.');
    const { printer, end } = there;
    const hostId = printer.connection === 'network' ? null : printer.hostTill;
    const worked = printer.connection === 'network'
      ? overTheNetwork(line, printer, end, siteMask)
      : overItsCable(line, printer, hostId === null ? undefined : tills.get(hostId));
    if (line.sender.kind === 'none' && off.size > 0) return worked;
    if (hostId !== null && off.has(hostId)) return workedOut(false, `${printer.name} is plugged into ${tills.get(hostId)?.name ?? 'a till'}, which is off.`, { via: worked.via });
    const measured = measurements.get(tillId)?.get(printerId);
    return measured === undefined ? worked : measuredReach(worked, measured, tills.get(tillId)?.name ?? '', printer.name);
  };

  return (till, printer) => {
    let row = known.get(till);
    if (row === undefined) known.set(till, (row = new Map()));
    let reach = row.get(printer);
    if (reach === undefined) row.set(printer, (reach = ask(till, printer)));
    return reach;
  };
};

/** One pair alone; for many pairs of one site compile once. */
export const canReach = (site: ReachSite, till: TillId, printer: PrinterId, options: ReachOptions = {}): Reach =>
  compileReach(site, options)(till, printer);
