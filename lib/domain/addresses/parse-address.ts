import ipaddr from 'ipaddr.js';
import { readAddress, type AddressNumber } from './read-address';

export type AddressFault = 'empty' | 'space' | 'ipv6' | 'short' | 'leading-zero' | 'too-large' | 'with-mask' | 'with-port' | 'form';

export type ParsedAddress =
  | { readonly ok: true; readonly value: AddressNumber }
  | {
    readonly ok: false;
    readonly fault: AddressFault;
    /** One or two sentences. */
    readonly reason: string;
    /** What many systems would make of it without a word (RFC 6943 3.1.1); null when they refuse it too. */
    readonly reading: string | null;
    /** What was most likely meant; null when nobody can know. */
    readonly instead: string | null;
  };

/** The loose reading of inet_aton: fewer parts, octal and hexadecimal. */
const looseReading = (text: string): string | null =>
  ipaddr.IPv4.isValid(text) ? ipaddr.IPv4.parse(text).toString() : null;

const strictOrNull = (text: string): string | null => (readAddress(text) === null ? null : text);

const withoutZeros = (text: string): string | null =>
  strictOrNull(text.split('.').map((part) => part.replace(/^0+(?=\d)/, '')).join('.'));

type Refusal = { readonly fault: AddressFault; readonly applies: (text: string) => boolean; readonly say: (text: string, reading: string | null) => string; readonly instead?: (text: string) => string | null };

const readAs = (reading: string | null): string => (reading === null ? '' : ` Many systems would read it as ${reading} without a word.`);

/** The first that applies speaks. */
const refusals: readonly Refusal[] = [
  { fault: 'empty', applies: (text) => text === '', say: () => 'There is no address yet.' },
  { fault: 'space', applies: (text) => /\s/u.test(text), say: () => 'An address has no spaces in it, before it or after it.', instead: (text) => strictOrNull(text.replace(/\s/gu, '')) },
  { fault: 'with-port', applies: (text) => /^\d+\.\d+\.\d+\.\d+:\d+$/.test(text), say: () => 'The port has a field of its own. Leave it off here.', instead: (text) => strictOrNull(text.split(':')[0] ?? '') },
  { fault: 'ipv6', applies: (text) => text.includes(':'), say: () => 'This is an IPv6 address. Ticket printers are set up with IPv4: four numbers with dots, for example 10.20.30.201.' },
  { fault: 'with-mask', applies: (text) => text.includes('/'), say: () => 'The mask has a field of its own. Leave the slash and what follows off here.', instead: (text) => strictOrNull(text.split('/')[0] ?? '') },
  { fault: 'leading-zero', applies: (text) => /^\d+\.\d+\.\d+\.\d+$/.test(text) && /(^|\.)0\d/.test(text), say: (_, reading) => `Leave out the leading zeros: some systems count such a part in eights.${readAs(reading)}`, instead: withoutZeros },
  { fault: 'too-large', applies: (text) => /^\d+\.\d+\.\d+\.\d+$/.test(text), say: () => 'Each of the four parts is at most 255.' },
  { fault: 'short', applies: (text) => /^\d+(\.\d+){1,2}$/.test(text), say: (text, reading) => `${text} has only ${text.split('.').length === 3 ? 'three' : 'two'} parts; an address has four.${readAs(reading)}` },
  { fault: 'form', applies: () => true, say: (_, reading) => `An address is four numbers from 0 to 255 with dots between, for example 10.20.30.201.${readAs(reading)}` },
];

/** Reads an IPv4 address strictly: four decimal parts, no leading zeros, no spaces (RFC 6943 3.1.1). */
export const parseAddress = (text: string): ParsedAddress => {
  const value = readAddress(text);
  if (value !== null) return { ok: true, value };
  const reading = looseReading(text);
  const refusal = refusals.find((one) => one.applies(text));
  return {
    ok: false,
    fault: refusal?.fault ?? 'form',
    reason: refusal?.say(text, reading) ?? '',
    reading,
    instead: refusal?.instead?.(text) ?? null,
  };
};
