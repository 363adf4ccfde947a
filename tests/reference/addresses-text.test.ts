import { isIPv4 } from 'node:net';
import * as fc from 'fast-check';
import ipaddr from 'ipaddr.js';
import { describe, expect, it } from 'vitest';
import { parseAddress } from '@/lib/domain/addresses/parse-address';
import { formatAddress, isValidAddress } from '@/lib/domain/addresses/read-address';
import { askPython } from './python-oracle';

/**
 * The strict and the loose form of RFC 6943 3.1.1. `loose` is what inet_aton and the WHATWG URL parser make of the
 * text without a word, as ipaddr.js 2.5.0 reads it; null where it refuses too.
 */
const table = [
  { text: '10.0.0.1', strict: true, loose: '10.0.0.1' },
  { text: '10.20.201', strict: false, loose: '10.20.0.201' },
  { text: '10.0.258', strict: false, loose: '10.0.1.2' },
  { text: '127.1', strict: false, loose: '127.0.0.1' },
  { text: '010.0.0.1', strict: false, loose: '8.0.0.1' },
  { text: '192.168.1.010', strict: false, loose: '192.168.1.8' },
  { text: '192.168.001.001', strict: false, loose: '192.168.1.1' },
  { text: '192.168.1.08', strict: false, loose: null },
  { text: '0300.0250.0.1', strict: false, loose: '192.168.0.1' },
  { text: '0x7f.1', strict: false, loose: '127.0.0.1' },
  { text: '2130706433', strict: false, loose: '127.0.0.1' },
  { text: '4294967295', strict: false, loose: '255.255.255.255' },
  { text: '4294967296', strict: false, loose: null },
  { text: '192.168.1.256', strict: false, loose: null },
  { text: '192.168.1.1.', strict: false, loose: null },
  { text: '192.168.1.1 ', strict: false, loose: null },
  { text: ' 192.168.1.1', strict: false, loose: null },
  { text: '192.168..1', strict: false, loose: null },
  { text: '1.2.3.4.5', strict: false, loose: null },
  { text: '', strict: false, loose: null },
  { text: '-1.2.3.4', strict: false, loose: null },
  { text: '１９２.168.1.1', strict: false, loose: null },
  { text: '192.168.1.1/24', strict: false, loose: null },
  { text: '0xA000102', strict: false, loose: '10.0.1.2' },
  { text: '012.0x102', strict: false, loose: '10.0.1.2' },
  { text: '10.11.12', strict: false, loose: '10.11.0.12' },
  { text: 'fe80::1', strict: false, loose: null },
  { text: '::ffff:10.0.0.1', strict: false, loose: null },
] as const;

const pythonStrict = `
import ipaddress, json, sys
def ok(text):
    try:
        return int(ipaddress.IPv4Address(text))
    except ValueError:
        return None
json.dump([ok(text) for text in json.load(sys.stdin)], sys.stdout)
`;

describe('an address is read strictly (RFC 6943 3.1.1)', () => {
  it.each(table)('$text', ({ text, strict, loose }) => {
    const parsed = parseAddress(text);
    expect(parsed.ok).toBe(strict);
    expect(isValidAddress(text)).toBe(strict);
    expect(parsed.ok ? formatAddress(parsed.value) : parsed.reading).toBe(loose);
    expect(isIPv4(text)).toBe(strict);
    expect(ipaddr.IPv4.isValidFourPartDecimal(text)).toBe(strict);
  });

  it('agrees with Python on every row of the table', () => {
    const answers = askPython<readonly (number | null)[]>(pythonStrict, table.map(({ text }) => text));
    expect(answers.map((answer) => answer !== null)).toEqual(table.map(({ strict }) => strict));
  });
});

const part = fc.oneof(
  { weight: 6, arbitrary: fc.nat(255).map(String) },
  { weight: 1, arbitrary: fc.nat(999).map(String) },
  { weight: 1, arbitrary: fc.nat(255).map((value) => `0${value}`) },
  { weight: 1, arbitrary: fc.constantFrom('', ' 1', '1 ', '0x1', '+1', '-1', '1e1', '١') },
);
const nearlyAddress = fc.array(part, { minLength: 1, maxLength: 5 }).map((parts) => parts.join('.'));

it('agrees with two other implementations on random texts that are nearly addresses', () => {
  const texts = fc.sample(nearlyAddress, { seed: 20261201, numRuns: 5_000 });
  const answers = askPython<readonly (number | null)[]>(pythonStrict, texts);
  const ours = texts.map((text) => {
    const parsed = parseAddress(text);
    return parsed.ok ? parsed.value : null;
  });
  expect(ours).toEqual(answers);
  expect(ours.map((value) => value !== null)).toEqual(texts.map((text) => ipaddr.IPv4.isValidFourPartDecimal(text)));
});
