import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readAddress } from '@/lib/domain/addresses/read-address';
import { rangeOf, specialRanges, verdictOf } from '@/lib/domain/addresses/special-ranges';
import { inSubnet } from '@/lib/domain/addresses/subnet';
import { askPython } from './python-oracle';

/** First and last address of each block, and what it means for a printer that keeps its address. */
const blocks = [
  ['0.0.0.0/8', '0.0.0.0', '0.255.255.255', 'refuse', 'RFC 6890'],
  ['10.0.0.0/8', '10.0.0.0', '10.255.255.255', 'fine', 'RFC 1918 3'],
  ['100.64.0.0/10', '100.64.0.0', '100.127.255.255', 'look', 'RFC 6598 7'],
  ['127.0.0.0/8', '127.0.0.0', '127.255.255.255', 'refuse', 'RFC 6890'],
  ['169.254.0.0/16', '169.254.0.0', '169.254.255.255', 'refuse', 'RFC 3927 2.1'],
  ['172.16.0.0/12', '172.16.0.0', '172.31.255.255', 'fine', 'RFC 1918 3'],
  ['192.0.0.0/24', '192.0.0.0', '192.0.0.255', 'refuse', 'RFC 6890'],
  ['192.0.2.0/24', '192.0.2.0', '192.0.2.255', 'refuse', 'RFC 5737 3'],
  ['192.88.99.0/24', '192.88.99.0', '192.88.99.255', 'refuse', 'RFC 6890'],
  ['192.168.0.0/16', '192.168.0.0', '192.168.255.255', 'fine', 'RFC 1918 3'],
  ['198.18.0.0/15', '198.18.0.0', '198.19.255.255', 'refuse', 'RFC 6890'],
  ['198.51.100.0/24', '198.51.100.0', '198.51.100.255', 'refuse', 'RFC 5737 3'],
  ['203.0.113.0/24', '203.0.113.0', '203.0.113.255', 'refuse', 'RFC 5737 3'],
  ['233.252.0.0/24', '233.252.0.0', '233.252.0.255', 'refuse', 'RFC 5771 9.2'],
  ['240.0.0.0/4', '240.0.0.0', '255.255.255.254', 'refuse', 'RFC 1112 4'],
  ['255.255.255.255/32', '255.255.255.255', '255.255.255.255', 'refuse', 'RFC 1122 3.2.1.3'],
] as const;

describe.each(blocks)('%s', (block, first, last, verdict, source) => {
  it(`runs from ${first} to ${last} and means ${verdict} (${source})`, () => {
    for (const text of [first, last]) expect(rangeOf(readAddress(text)!)).toMatchObject({ block, verdict });
  });
});

it('lists exactly these blocks and the multicast one', () => {
  expect(specialRanges.map((range) => range.block).toSorted()).toEqual([...blocks.map(([block]) => block), '224.0.0.0/4'].toSorted());
});

/** Just inside and just outside: Python ipaddress 3.11 (is_private, is_global, is_link_local, is_multicast, is_reserved). */
it.each([
  ['172.15.255.255', 'look'], ['172.16.0.0', 'fine'], ['172.31.255.255', 'fine'], ['172.32.0.0', 'look'],
  ['100.63.255.255', 'look'], ['100.64.0.1', 'look'], ['100.127.255.255', 'look'], ['100.128.0.0', 'look'],
  ['9.255.255.255', 'look'], ['11.0.0.0', 'look'], ['192.167.255.255', 'look'], ['192.169.0.0', 'look'],
  ['126.255.255.255', 'look'], ['128.0.0.0', 'look'], ['169.253.255.255', 'look'], ['169.254.1.1', 'refuse'], ['169.255.0.0', 'look'],
  ['223.255.255.255', 'look'], ['224.0.0.1', 'refuse'], ['239.255.255.255', 'refuse'], ['240.0.0.1', 'refuse'], ['255.255.255.255', 'refuse'],
  ['198.17.255.255', 'look'], ['198.20.0.0', 'look'], ['1.0.0.0', 'look'],
] as const)('%s means %s', (text, verdict) => {
  expect(verdictOf(readAddress(text)!)).toBe(verdict);
});

it('tells provider-shared from public, which both ask for a look (RFC 6598)', () => {
  expect(rangeOf(readAddress('100.127.255.255')!).name).toBe('provider-shared');
  expect(rangeOf(readAddress('100.128.0.0')!).name).toBe('public');
});

const python = `
import ipaddress, json, sys
out = []
for value in json.load(sys.stdin):
    a = ipaddress.IPv4Address(value)
    out.append([a.is_loopback, a.is_link_local, a.is_multicast, a.is_reserved, a.is_unspecified])
json.dump(out, sys.stdout)
`;

it('refuses whatever Python calls loopback, link-local, multicast, reserved or unspecified', () => {
  const edges = specialRanges.flatMap(({ subnet }) => [subnet.network, subnet.broadcast, subnet.network - 1, subnet.broadcast + 1]).filter((value) => value >= 0 && value <= 0xffffffff);
  const values = [...edges, ...fc.sample(fc.nat(0xffffffff), { seed: 20261201, numRuns: 2_000 })];
  const answers = askPython<readonly boolean[][]>(python, values);
  const wronglyTaken = values.filter((value, index) => answers[index]!.includes(true) && verdictOf(value) !== 'refuse');
  expect(wronglyTaken).toEqual([]);
});

it('calls an address fine exactly when it is in one of the three ranges of RFC 1918', () => {
  const privateRanges = specialRanges.filter((range) => range.verdict === 'fine');
  expect(privateRanges).toHaveLength(3);
  fc.assert(fc.property(fc.nat(0xffffffff), (value) => {
    expect(verdictOf(value) === 'fine').toBe(privateRanges.some((range) => inSubnet(value, range.subnet)));
  }), { seed: 20261201, numRuns: 2_000 });
});
