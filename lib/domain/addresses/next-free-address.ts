import { formatAddress, readAddress, type AddressNumber } from './read-address';
import { verdictOf } from './special-ranges';
import { isHostOf, readSubnet, type Subnet } from './subnet';
import { addressHolders, inPool, readPool, type AddressSite } from './taken-addresses';

export type DeviceKind = 'printer' | 'till';

/** Where a kind's block starts on a site that has none yet: .201 and .61 of a /24, the same share of any other size. */
const firstOfBlock = (kind: DeviceKind, subnet: Subnet): AddressNumber =>
  subnet.network + Math.max(1, Math.floor(((kind === 'printer' ? 201 : 61) / 256) * Math.min(256, subnet.broadcast - subnet.network + 1)));

/** Addresses that count as a kind's block: those that may stay where they are. */
const blockOf = (site: AddressSite, kind: DeviceKind, subnet: Subnet, refused: ReadonlySet<AddressNumber>): readonly AddressNumber[] => {
  const pool = readPool(site.network);
  return addressHolders(site)
    .filter((holder) => holder.kind === kind && isHostOf(holder.address, subnet) && !refused.has(holder.address) && !inPool(holder.address, pool))
    .map((holder) => holder.address);
};

const keptBack = (site: AddressSite): ReadonlySet<AddressNumber> =>
  new Set([site.network.gateway, ...site.network.reserved.map((reservation) => reservation.address)].flatMap((text) => readAddress(text) ?? []));

/**
 * The next free address for a device of this kind: upwards from the end of its block, then downwards from there.
 * Never in the pool, never the gateway's, a reserved one, one in use now or one in `except`. Null when the site has
 * no usable subnet or nothing is left. Same site, same answer.
 */
export const nextFreeAddress = (site: AddressSite, kind: DeviceKind, except: readonly string[] = []): string | null => {
  const subnet = readSubnet(site.network.subnet);
  if (subnet === null || verdictOf(subnet.network) === 'refuse') return null;
  const pool = readPool(site.network);
  const kept = keptBack(site);
  const present = site.printers.flatMap((printer) => readAddress(printer.presentAddress) ?? []);
  const taken = new Set([...kept, ...present, ...addressHolders(site).map((holder) => holder.address), ...except.flatMap((text) => readAddress(text) ?? [])]);
  const block = blockOf(site, kind, subnet, kept);
  const start = block.length === 0 ? firstOfBlock(kind, subnet) : Math.max(...block) + 1;
  const isFree = (address: AddressNumber): boolean => !taken.has(address) && !inPool(address, pool);
  for (let address = start; address < subnet.broadcast; address += 1) {
    if (isFree(address)) return formatAddress(address);
    if (inPool(address, pool) && pool !== null) address = pool.to;
  }
  for (let address = start - 1; address > subnet.network; address -= 1) {
    if (isFree(address)) return formatAddress(address);
    if (inPool(address, pool) && pool !== null) address = pool.from;
  }
  return null;
};
