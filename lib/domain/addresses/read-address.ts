/** An IPv4 address as an unsigned 32-bit number, so that it can be compared and counted. */
export type AddressNumber = number;

const strictForm = /^(0|[1-9]\d{0,2})\.(0|[1-9]\d{0,2})\.(0|[1-9]\d{0,2})\.(0|[1-9]\d{0,2})$/;

/** The strict form only (RFC 6943 3.1.1: four decimal parts); null for everything else. */
export const readAddress = (text: string): AddressNumber | null => {
  const match = strictForm.exec(text);
  if (match === null) return null;
  let value = 0;
  for (const part of match.slice(1)) {
    const octet = Number(part);
    if (octet > 255) return null;
    value = value * 256 + octet;
  }
  return value;
};

export const isValidAddress = (text: string): boolean => readAddress(text) !== null;

export const formatAddress = (value: AddressNumber): string =>
  [value >>> 24, (value >>> 16) & 255, (value >>> 8) & 255, value & 255].join('.');
