import { readMask } from '../addresses/masks';
import { readAddress } from '../addresses/read-address';
import { verdictOf } from '../addresses/special-ranges';
import { inSubnet, isHostOf, subnetAround, type Subnet } from '../addresses/subnet';
import type { BrokenDirection } from './reach';

/** One end of a cable: a device with an address and the network its own mask puts it in. */
export type Endpoint = {
  readonly name: string;
  /** As written, for the sentences. */
  readonly address: string;
  readonly mask: string;
  /** First and last address it may have: the same, unless the address is not known. */
  readonly from: number;
  readonly to: number;
  readonly network: Subnet;
};

export type EndpointResult = { readonly ok: true; readonly value: Endpoint } | { readonly ok: false; readonly why: string };

export const endpointOf = (name: string, address: string, mask: string): EndpointResult => {
  if (address === '') return { ok: false, why: `${name} has no address yet.` };
  const value = readAddress(address);
  if (value === null) return { ok: false, why: `${name} has ${address}, which is not an address.` };
  const prefix = readMask(mask);
  if (prefix === null) return { ok: false, why: mask === '' ? `${name} has no mask yet.` : `${name} has ${mask}, which is not a mask.` };
  if (verdictOf(value) === 'refuse') return { ok: false, why: `${name} has ${address}, which no device can be reached at.` };
  const network = subnetAround(value, prefix);
  if (!isHostOf(value, network)) return { ok: false, why: `${name} has ${address}, which with the mask ${mask} is no device's address.` };
  return { ok: true, value: { name, address, mask, from: value, to: value, network } };
};

/** A device whose address the router gives it, somewhere in the site's subnet. */
export const endpointSomewhere = (name: string, subnet: Subnet, mask: string): Endpoint => ({
  name, address: '', mask, from: subnet.network + 1, to: subnet.broadcast - 1, network: subnet,
});

const knows = (one: Endpoint, other: Endpoint): boolean => inSubnet(other.from, one.network) && inSubnet(other.to, one.network);

export const brokenBetween = (till: Endpoint, printer: Endpoint): BrokenDirection | null => {
  const there = knows(till, printer);
  const back = knows(printer, till);
  if (there && back) return null;
  return !there && !back ? 'both' : there ? 'to-till' : 'to-printer';
};

const maskBlame = (till: Endpoint, printer: Endpoint, siteMask: string | null): string => {
  const wrong = [till, printer].filter((end) => siteMask !== null && end.mask !== siteMask);
  const [only] = wrong;
  return wrong.length === 1 && only !== undefined ? ` The mask of ${only.name} is wrong: ${only.mask} instead of ${siteMask}.` : '';
};

/** Says which way the packets get lost, and whose mask is to blame when one differs from the site's. */
export const sayBroken = (broken: BrokenDirection, till: Endpoint, printer: Endpoint, siteMask: string | null): string => {
  switch (broken) {
    case 'both': return `${till.name} and ${printer.name} are in different networks${till.address === '' ? '' : `: ${till.address} and ${printer.address}`}.`;
    case 'to-printer': return `${till.name} takes ${printer.name} for another network and sends nothing to it.${maskBlame(till, printer, siteMask)}`;
    case 'to-till': return `${printer.name} takes ${till.name} for another network, so its answers do not come back.${maskBlame(till, printer, siteMask)}`;
  }
};
