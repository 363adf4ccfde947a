import type { Finding, Fix } from '../findings/finding';
import type { Site } from '../site/site';
import { parseAddress } from './parse-address';
import { readMask } from './masks';
import { readAddress } from './read-address';
import { rangeOf, verdictOf } from './special-ranges';
import { formatSubnet, inSubnet, isHostOf, isValidSubnet, parseSubnet, readSubnet, subnetAround, type Subnet } from './subnet';
import { judgeDeviceAddress, siteMaskOf } from './device-findings';
import { maskFinding } from './mask-findings';
import { nextFreeAddress } from './next-free-address';
import { inPool, readPool, type AddressSite } from './taken-addresses';

type NetworkSite = AddressSite & Pick<Site, 'id'>;

const finding = (site: NetworkSite, code: string, severity: Finding['severity'], field: string, title: string, message: string, fixes: readonly Fix[] = []): Finding =>
  ({ code, severity, subject: { kind: 'site', id: site.id, field }, title, message, fixes });

/** The network most devices already have, offered when nobody has said what the site's is. */
const likelySubnet = (site: NetworkSite): string | null => {
  const around = [...site.printers, ...site.tills].flatMap((device) => {
    const address = readAddress(device.address);
    const prefix = readMask(device.mask);
    return address === null || prefix === null || verdictOf(address) === 'refuse' ? [] : [formatSubnet(subnetAround(address, prefix))];
  }).filter(isValidSubnet);
  const counts = new Map<string, number>();
  for (const text of around) counts.set(text, (counts.get(text) ?? 0) + 1);
  return [...counts].toSorted((left, right) => right[1] - left[1] || left[0].localeCompare(right[0]))[0]?.[0] ?? null;
};

const subnetFindings = (site: NetworkSite): readonly Finding[] => {
  const parsed = parseSubnet(site.network.subnet);
  if (!parsed.ok) {
    const needed = site.printers.some((printer) => printer.connection === 'network');
    const instead = parsed.instead ?? likelySubnet(site);
    const fixes: readonly Fix[] = instead === null ? [] : [{ kind: 'set-network', change: { subnet: instead }, label: `Use ${instead}` }];
    return parsed.fault === 'empty'
      ? [finding(site, 'subnet-missing', needed ? 'stop' : 'note', 'subnet', 'The site has no network yet', 'Until it is written down, no address can be checked. It is in the router, for example 10.20.30.0/24.', fixes)]
      : [finding(site, 'subnet-form', 'stop', 'subnet', `The site's network cannot be ${site.network.subnet}`, parsed.reason, fixes)];
  }
  const range = rangeOf(parsed.value.network);
  return range.verdict === 'refuse'
    ? [finding(site, 'subnet-range', 'stop', 'subnet', `The site's network cannot be ${site.network.subnet}`, `Its addresses are ${range.meaning}.`)]
    : [];
};

const gatewayFindings = (site: NetworkSite, subnet: Subnet): readonly Finding[] => {
  const { gateway } = site.network;
  if (gateway === '') return [finding(site, 'gateway-missing', 'note', 'gateway', 'Nobody has said which address the router has', 'Its address is never given to a printer, once it is known.')];
  const parsed = parseAddress(gateway);
  if (!parsed.ok) return [finding(site, 'gateway-form', 'stop', 'gateway', `The router cannot have ${gateway}`, parsed.reason, parsed.instead === null ? [] : [{ kind: 'set-network', change: { gateway: parsed.instead }, label: `Use ${parsed.instead}` }])];
  // RFC 1122 3.3.1: a host hands what is not near to a gateway on its own network.
  return isHostOf(parsed.value, subnet) ? []
    : [finding(site, 'gateway-outside', 'stop', 'gateway', 'The router is outside the site\'s network', `${gateway} is no device's address in ${formatSubnet(subnet)}. One of the two is wrong.`)];
};

const noPool: Fix = { kind: 'set-network', change: { poolFrom: '', poolTo: '' }, label: 'The router hands out nothing' };

const poolFindings = (site: NetworkSite, subnet: Subnet): readonly Finding[] => {
  const { poolFrom, poolTo, gateway } = site.network;
  if (poolFrom === '' && poolTo === '') return [];
  const from = readAddress(poolFrom);
  const to = readAddress(poolTo);
  if (from === null || to === null) {
    const field = from === null ? 'poolFrom' : 'poolTo';
    const parsed = parseAddress(site.network[field]);
    return [finding(site, 'pool-form', 'stop', field, 'What the router hands out has no two ends', parsed.ok ? '' : parsed.reason, [noPool])];
  }
  if (from > to) return [finding(site, 'pool-reversed', 'stop', 'poolFrom', 'What the router hands out ends before it starts', `${poolFrom} is after ${poolTo}.`, [{ kind: 'set-network', change: { poolFrom: poolTo, poolTo: poolFrom }, label: 'Swap the two' }])];
  if (!inSubnet(from, subnet) || !inSubnet(to, subnet)) return [finding(site, 'pool-outside', 'stop', 'poolFrom', 'The router hands out addresses outside the site\'s network', `${poolFrom} to ${poolTo} is not all in ${formatSubnet(subnet)}.`, [noPool])];
  const router = readAddress(gateway);
  return router !== null && inPool(router, readPool(site.network))
    ? [finding(site, 'pool-holds-gateway', 'check', 'poolFrom', 'The router hands out its own address', `${gateway} is between ${poolFrom} and ${poolTo}. Most routers leave it out by themselves; look whether this one does.`)]
    : [];
};

const reservationFindings = (site: NetworkSite, subnet: Subnet): readonly Finding[] => {
  const seen = new Set<number>();
  return site.network.reserved.flatMap((reservation, index): readonly Finding[] => {
    const field = `reserved.${index}.address`;
    const parsed = parseAddress(reservation.address);
    const forWhom = reservation.reason === '' ? 'A reserved address' : `The address kept for ${reservation.reason}`;
    if (!parsed.ok) return [finding(site, 'reserved-form', 'stop', field, `${forWhom} cannot be read`, parsed.reason)];
    const twice = seen.has(parsed.value);
    seen.add(parsed.value);
    if (twice) return [finding(site, 'reserved-twice', 'check', field, `${reservation.address} is reserved twice`, 'Only one of the two can have it.')];
    return isHostOf(parsed.value, subnet) ? []
      : [finding(site, 'reserved-outside', 'check', field, `${forWhom} is outside the site's network`, `${reservation.address} is no device's address in ${formatSubnet(subnet)}.`)];
  });
};

const linkFindings = (site: NetworkSite): readonly Finding[] => {
  if (site.link.kind !== 'own') return [];
  const { address, mask } = site.link;
  const siteMask = siteMaskOf(site);
  const setTo = (to: string, withMask: string): Fix => ({ kind: 'set-link-address', address: to, mask: withMask, label: `Give it ${to}` });
  const subject = { kind: 'site', id: site.id } as const;
  return [
    ...judgeDeviceAddress(site, {
      kind: 'link', id: 'link', name: 'The print link', address, mask, keepsItsAddress: true, yields: false, subject,
      free: nextFreeAddress(site, 'till'), offer: (to) => (to === null ? [] : [setTo(to, siteMask ?? mask)]),
    }),
    ...maskFinding({ name: 'The print link', mask, subject, offer: (to) => ({ kind: 'set-link-address', address, mask: to, label: `Use ${to}` }) }, siteMask),
  ].map((one) => ({ ...one, code: `link-${one.code}`, subject: { ...one.subject, field: `link.${one.subject.field ?? 'address'}` } }));
};

/** What is wrong with the network as a whole, before any device is looked at. */
export const networkFindings = (site: NetworkSite): readonly Finding[] => {
  const subnet = readSubnet(site.network.subnet);
  return [
    ...subnetFindings(site),
    ...(subnet === null ? [] : [...gatewayFindings(site, subnet), ...poolFindings(site, subnet), ...reservationFindings(site, subnet)]),
    ...linkFindings(site),
  ];
};
