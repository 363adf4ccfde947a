import type { AddressNumber } from './read-address';
import { inSubnet, subnetAround, type Subnet } from './subnet';
import { readAddress } from './read-address';

/** What an address in a range means for a printer that keeps it. */
export type Verdict = 'fine' | 'look' | 'refuse';

export type SpecialRange = {
  readonly block: string;
  readonly subnet: Subnet;
  readonly name: string;
  readonly verdict: Verdict;
  /** Follows "10.0.0.1 is", and says what it means. */
  readonly meaning: string;
};

const range = (block: string, name: string, verdict: Verdict, meaning: string): SpecialRange => {
  const [address = '', prefix = '32'] = block.split('/');
  return { block, subnet: subnetAround(readAddress(address) ?? 0, Number(prefix)), name, verdict, meaning };
};

/** The IANA special-purpose registry as RFC 6890 2.2.2 has it; where ranges overlap the narrower stands first. */
export const specialRanges: readonly SpecialRange[] = [
  range('255.255.255.255/32', 'limited broadcast', 'refuse', 'the address for everybody at once, never for one device'), // RFC 1122 3.2.1.3
  range('0.0.0.0/8', 'this network', 'refuse', 'what a device says before it has an address'), // RFC 6890, RFC 1122 3.2.1.3
  range('10.0.0.0/8', 'private', 'fine', 'a private address'), // RFC 1918 3
  range('100.64.0.0/10', 'provider-shared', 'look', 'from the range internet providers share among their customers'), // RFC 6598 7
  range('127.0.0.0/8', 'loopback', 'refuse', 'the way a device talks to itself'), // RFC 1122 3.2.1.3 (g)
  range('169.254.0.0/16', 'self-assigned', 'refuse', 'what a device picks by itself when it gets no address: no answer from the router, a loose cable or a dead switch. It may change at any time'), // RFC 3927 1.9, 2.1, 2.9
  range('172.16.0.0/12', 'private', 'fine', 'a private address'), // RFC 1918 3
  range('192.0.0.0/24', 'protocol assignments', 'refuse', 'kept for the protocols of the internet'), // RFC 6890
  range('192.0.2.0/24', 'examples', 'refuse', 'an example from documents, never a real network'), // RFC 5737 3
  range('192.88.99.0/24', 'relay anycast', 'refuse', 'kept for relays of the internet'), // RFC 6890, RFC 7526
  range('192.168.0.0/16', 'private', 'fine', 'a private address'), // RFC 1918 3
  range('198.18.0.0/15', 'benchmarking', 'refuse', 'kept for testing network equipment'), // RFC 6890
  range('198.51.100.0/24', 'examples', 'refuse', 'an example from documents, never a real network'), // RFC 5737 3
  range('203.0.113.0/24', 'examples', 'refuse', 'an example from documents, never a real network'), // RFC 5737 3
  range('233.252.0.0/24', 'multicast examples', 'refuse', 'an example of a group address, never one device'), // RFC 5771 9.2
  range('224.0.0.0/4', 'multicast', 'refuse', 'the address of a group, never of one device'), // RFC 1112 4, RFC 5771
  range('240.0.0.0/4', 'reserved', 'refuse', 'reserved and not in use anywhere'), // RFC 1112 4
];

/** Everything the table leaves over can be reached from the internet. */
export const publicRange: SpecialRange = range('0.0.0.0/0', 'public', 'look', 'a public address, so the printer could be reached from outside');

export const rangeOf = (address: AddressNumber): SpecialRange =>
  specialRanges.find((special) => inSubnet(address, special.subnet)) ?? publicRange;

export const verdictOf = (address: AddressNumber): Verdict => rangeOf(address).verdict;
