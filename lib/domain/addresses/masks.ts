import { formatAddress, readAddress } from './read-address';

/** How many leading bits of an address name its network, 0 to 32. */
export type PrefixLength = number;

/** 24 gives 255.255.255.0 as a number. */
export const maskNumber = (prefix: PrefixLength): number => (prefix === 0 ? 0 : (0xffffffff << (32 - prefix)) >>> 0);

export const maskOf = (prefix: PrefixLength): string => formatAddress(maskNumber(prefix));

const prefixByMask: ReadonlyMap<string, PrefixLength> = new Map(
  Array.from({ length: 33 }, (_, prefix) => [maskOf(prefix), prefix]),
);

/** The one-bits of a mask must be left contiguous (RFC 4632 5.1): 255.255.255.0 gives 24, 255.255.255.88 gives null. */
export const readMask = (text: string): PrefixLength | null => prefixByMask.get(text) ?? null;

export const isValidMask = (text: string): boolean => prefixByMask.has(text);

/** Four well-formed parts whose one-bits have a hole, which deserves a different sentence than nonsense. */
export const isHoledMask = (text: string): boolean => readAddress(text) !== null && !isValidMask(text);
