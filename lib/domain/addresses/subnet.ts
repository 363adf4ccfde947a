import { maskNumber, type PrefixLength } from './masks';
import { formatAddress, readAddress, type AddressNumber } from './read-address';

export type Subnet = {
  readonly network: AddressNumber;
  readonly broadcast: AddressNumber;
  readonly prefix: PrefixLength;
};

/** The network that an address falls in under a prefix length. */
export const subnetAround = (address: AddressNumber, prefix: PrefixLength): Subnet => {
  const mask = maskNumber(prefix);
  const network = (address & mask) >>> 0;
  return { network, broadcast: (network | ~mask) >>> 0, prefix };
};

export const inSubnet = (address: AddressNumber, subnet: Subnet): boolean =>
  address >= subnet.network && address <= subnet.broadcast;

/** Neither the network's own address nor its broadcast (RFC 1122 3.2.1.3), which no device may have. */
export const isHostOf = (address: AddressNumber, subnet: Subnet): boolean =>
  address > subnet.network && address < subnet.broadcast;

/** How many devices fit. */
export const hostCount = (subnet: Subnet): number => Math.max(0, subnet.broadcast - subnet.network - 1);

export const formatSubnet = (subnet: Subnet): string => `${formatAddress(subnet.network)}/${subnet.prefix}`;

/** The widest and the narrowest subnet a site may have: a /31 or /32 leaves no room for a gateway (RFC 3021, RFC 1878). */
export const widestPrefix = 8;
export const narrowestPrefix = 30;

export type SubnetFault = 'empty' | 'form' | 'address' | 'prefix' | 'host-bits';

export type ParsedSubnet =
  | { readonly ok: true; readonly value: Subnet }
  | { readonly ok: false; readonly fault: SubnetFault; readonly reason: string; readonly instead: string | null };

const cidr = /^([^/]+)\/(\d{1,2})$/;

const refuse = (fault: SubnetFault, reason: string, instead: string | null = null): ParsedSubnet => ({ ok: false, fault, reason, instead });

/** Reads "10.20.30.0/24"; a refusal says why and, when there is a likely meaning, what to write instead. */
export const parseSubnet = (text: string): ParsedSubnet => {
  if (text === '') return refuse('empty', 'Nobody has said which network this site uses.');
  const match = cidr.exec(text);
  if (match === null) return refuse('form', `${text} is not a network. Write its first address and its length, for example 10.20.30.0/24.`);
  const address = readAddress(match[1] ?? '');
  if (address === null) return refuse('address', `${match[1]} is not an address of four parts, each from 0 to 255.`);
  const prefix = Number(match[2]);
  if (prefix < widestPrefix || prefix > narrowestPrefix) {
    return refuse('prefix', `A site's network is between /${widestPrefix} and /${narrowestPrefix}. A /${prefix} ${prefix < widestPrefix ? 'is far larger than any site' : 'has no room for a router and printers'}.`);
  }
  const value = subnetAround(address, prefix);
  if (value.network !== address) {
    return refuse('host-bits', `${text} names a device, not a network. The network it is in is ${formatSubnet(value)}.`, formatSubnet(value));
  }
  return { ok: true, value };
};

export const isValidSubnet = (text: string): boolean => parseSubnet(text).ok;

/** For callers that only need to know where the site is, and leave the mistake to the checks. */
export const readSubnet = (text: string): Subnet | null => {
  const parsed = parseSubnet(text);
  return parsed.ok ? parsed.value : null;
};
