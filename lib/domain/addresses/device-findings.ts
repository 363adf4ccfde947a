import type { Finding, Fix, Subject } from '../findings/finding';
import { parseAddress } from './parse-address';
import { maskOf } from './masks';
import { formatAddress, type AddressNumber } from './read-address';
import { rangeOf, type SpecialRange } from './special-ranges';
import { formatSubnet, inSubnet, readSubnet, type Subnet } from './subnet';
import { addressHolders, inPool, isReservedFor, readPool, reservationAt, type AddressSite, type Holder } from './taken-addresses';

/** A device whose address is judged, whatever kind it is. */
export type Device = {
  readonly kind: Holder['kind'];
  readonly id: string;
  readonly name: string;
  readonly address: string;
  readonly mask: string;
  /** False for a device that the router's pool is meant for. */
  readonly keepsItsAddress: boolean;
  readonly subject: Subject;
  /** The fix that gives it an address; null when there is none to give. */
  readonly offer: (address: string | null) => readonly Fix[];
  /** The next free address of its kind. */
  readonly free: string | null;
  /** True while it is being typed: then it has to move, whoever else has the address. */
  readonly yields: boolean;
};

export type JudgeOptions = {
  /** Addresses already offered to other devices, so that all fixes of a site can be pressed one after the other. */
  readonly promised?: readonly string[];
  readonly yields?: boolean;
};

type Judged = {
  readonly device: Device;
  readonly address: AddressNumber;
  readonly range: SpecialRange;
  readonly site: AddressSite;
  readonly subnet: Subnet | null;
  readonly other: Holder | undefined;
};

type AddressRule = {
  readonly code: string;
  readonly applies: (judged: Judged) => boolean;
  readonly title: (judged: Judged) => string;
  readonly message: (judged: Judged) => string;
};

/** Two that share an address: the one with the weaker claim has to move. */
const otherHolder = (site: AddressSite, device: Device, address: AddressNumber): Holder | undefined => {
  const isItself = (holder: Holder): boolean => holder.kind === device.kind && holder.id === device.id;
  const holders = addressHolders(site).filter((holder) => holder.address === address);
  if (device.yields) return holders.find((holder) => !isItself(holder));
  const [first] = holders;
  return first === undefined || isItself(first) ? undefined : first;
};

const reservedForAnother = ({ site, device, address }: Judged) => {
  const reservation = reservationAt(site.network, address);
  return reservation === undefined || isReservedFor(reservation, device.name) ? undefined : reservation;
};

/** The first that applies is the finding; a device never gets two stops about one address. */
const stops: readonly AddressRule[] = [
  {
    code: 'address-range',
    applies: ({ range }) => range.verdict === 'refuse',
    title: ({ device }) => `${device.name} cannot have ${device.address}`,
    message: ({ device, range }) => `${device.address} is ${range.meaning}.`,
  },
  {
    code: 'address-outside',
    applies: ({ address, subnet }) => subnet !== null && !inSubnet(address, subnet),
    title: ({ device }) => `${device.name} is outside the site's network`,
    message: ({ device, subnet }) => `${device.address} is not in ${subnet === null ? '' : formatSubnet(subnet)}, so the other devices of the site cannot reach it.`,
  },
  {
    code: 'address-of-network', // RFC 1122 3.2.1.3
    applies: ({ address, subnet }) => subnet !== null && address === subnet.network,
    title: ({ device }) => `${device.name} has the address of the network itself`,
    message: () => 'The first address of a network belongs to no device.',
  },
  {
    code: 'address-of-broadcast', // RFC 1122 3.2.1.3 (e)
    applies: ({ address, subnet }) => subnet !== null && address === subnet.broadcast,
    title: ({ device }) => `${device.name} has the network's broadcast address`,
    message: () => 'The last address of a network means everybody at once and belongs to no device.',
  },
  {
    code: 'address-of-gateway',
    applies: ({ address, site }) => formatAddress(address) === site.network.gateway,
    title: ({ device }) => `${device.name} has the router's address`,
    message: () => 'Two devices with one address cut each other off, and this one takes the whole site with it.',
  },
  {
    code: 'address-reserved',
    applies: (judged) => reservedForAnother(judged) !== undefined,
    title: (judged) => `${judged.device.name} has an address kept for ${reservedForAnother(judged)?.reason || 'something else'}`,
    message: ({ device }) => `${device.address} is on the site's list of reserved addresses.`,
  },
  {
    code: 'address-taken',
    applies: ({ other }) => other !== undefined,
    title: ({ device, other }) => `${device.name} has the same address as ${other?.name ?? 'another device'}`,
    message: ({ device }) => `Two devices at ${device.address} cut each other off: tickets come out on whichever answers first, or not at all.`,
  },
];

const looks: readonly AddressRule[] = [
  {
    code: 'address-in-pool',
    applies: ({ device, address, site }) => device.keepsItsAddress && inPool(address, readPool(site.network)) && reservationAt(site.network, address) === undefined,
    title: ({ device }) => `${device.name} has an address that the router may give away`,
    message: ({ device, site }) => `The router hands out ${site.network.poolFrom} to ${site.network.poolTo}. The day another device gets ${device.address}, ${device.name} stops.`,
  },
  {
    code: 'address-not-private',
    applies: ({ range }) => range.verdict === 'look',
    title: ({ device }) => `${device.name} does not have a private address`,
    message: ({ device, range }) => `${device.address} is ${range.meaning}. Ask whoever set up the network whether that is meant.`,
  },
];

const findingOf = (rule: AddressRule, severity: 'stop' | 'check', judged: Judged, fixes: readonly Fix[]): Finding => ({
  code: rule.code, severity, subject: { ...judged.device.subject, field: 'address' },
  title: rule.title(judged), message: rule.message(judged), fixes,
});

const usable = (site: AddressSite, device: Device, text: string | null): string | null => {
  if (text === null) return null;
  const candidate = { ...device, address: text };
  return judgeDeviceAddress(site, candidate).length === 0 ? text : null;
};

/** All there is to say of the address of one device; the mask has its own check. */
export const judgeDeviceAddress = (site: AddressSite, device: Device): readonly Finding[] => {
  const parsed = parseAddress(device.address);
  if (!parsed.ok) {
    const missing = parsed.fault === 'empty';
    return [{
      code: missing ? 'address-missing' : 'address-form', severity: 'stop', subject: { ...device.subject, field: 'address' },
      title: missing ? `${device.name} has no address yet` : `${device.name} has ${device.address.trim()}, which is not an address`,
      message: missing ? 'Nothing reaches it over the network until it has one.' : parsed.reason,
      fixes: device.offer(usable(site, device, parsed.instead) ?? device.free),
    }];
  }
  const judged: Judged = {
    device, address: parsed.value, range: rangeOf(parsed.value), site, subnet: readSubnet(site.network.subnet),
    other: otherHolder(site, device, parsed.value),
  };
  const stop = stops.find((rule) => rule.applies(judged));
  if (stop !== undefined) return [findingOf(stop, 'stop', judged, device.offer(device.free))];
  return looks.filter((rule) => rule.applies(judged)).map((rule) => {
    const reserve: readonly Fix[] = rule.code !== 'address-in-pool' ? []
      : [{ kind: 'reserve-address', address: device.address, reason: device.name, label: `It is reserved in the router for ${device.name}` }];
    return findingOf(rule, 'check', judged, [...device.offer(rule.code === 'address-in-pool' ? device.free : null), ...reserve]);
  });
};

/** The mask that every device of the site must have; null while the subnet is not known. */
export const siteMaskOf = (site: Pick<AddressSite, 'network'>): string | null => {
  const subnet = readSubnet(site.network.subnet);
  return subnet === null ? null : maskOf(subnet.prefix);
};
