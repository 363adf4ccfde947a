import type { Network, Reservation, Site } from '../site/site';
import { readAddress, type AddressNumber } from './read-address';

/** The parts of a site that the address rules read. */
export type AddressSite = Pick<Site, 'network' | 'printers' | 'tills' | 'link'>;

/** A device that holds an address, in words ("GRILL1", "the print link"). */
export type Holder = {
  readonly kind: 'printer' | 'till' | 'link';
  readonly id: string;
  readonly name: string;
  readonly address: AddressNumber;
  /** Who may keep an address that two have: the higher. */
  readonly claim: number;
};

const stageClaim = { planned: 0, addressed: 1, reachable: 2, tested: 3, 'signed-off': 4 } as const;

/**
 * Every address that a device has now. When two have the same one the more settled device keeps it: tills before
 * printers, printers by stage, then the one listed first.
 */
export const addressHolders = (site: AddressSite): readonly Holder[] => {
  const holders: Holder[] = [];
  const add = (kind: Holder['kind'], id: string, name: string, text: string, claim: number): void => {
    const address = readAddress(text);
    if (address !== null) holders.push({ kind, id, name, address, claim });
  };
  if (site.link.kind === 'own') add('link', 'link', 'the print link', site.link.address, 9);
  for (const till of site.tills) add('till', till.id, till.name, till.address, 8);
  for (const printer of site.printers) {
    if (printer.connection === 'network') add('printer', printer.id, printer.name, printer.address, stageClaim[printer.stage]);
  }
  return holders.toSorted((left, right) => right.claim - left.claim);
};

export type Pool = { readonly from: AddressNumber; readonly to: AddressNumber };

/** What the router hands out; null when it hands out nothing or the two ends make no range. */
export const readPool = (network: Pick<Network, 'poolFrom' | 'poolTo'>): Pool | null => {
  const from = readAddress(network.poolFrom);
  const to = readAddress(network.poolTo);
  return from === null || to === null || from > to ? null : { from, to };
};

export const inPool = (address: AddressNumber, pool: Pool | null): boolean =>
  pool !== null && address >= pool.from && address <= pool.to;

const escapeForPattern = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/** A reservation is a device's own when its reason names the device as a whole word: "GRILL1", "GRILL1, hot line". */
export const isReservedFor = (reservation: Reservation, name: string): boolean =>
  name !== '' && new RegExp(`(^|[^\\p{L}\\p{N}_-])${escapeForPattern(name)}($|[^\\p{L}\\p{N}_-])`, 'iu').test(reservation.reason);

export const reservationAt = (network: Network, address: AddressNumber): Reservation | undefined =>
  network.reserved.find((reservation) => readAddress(reservation.address) === address);
