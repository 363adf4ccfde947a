import * as fc from 'fast-check';
import ipaddr from 'ipaddr.js';
import { describe, expect, it } from 'vitest';
import { isHoledMask, isValidMask, maskOf, readMask } from '@/lib/domain/addresses/masks';
import { formatAddress, readAddress } from '@/lib/domain/addresses/read-address';
import { hostCount, inSubnet, isHostOf, parseSubnet, subnetAround } from '@/lib/domain/addresses/subnet';
import { askPython } from './python-oracle';

/** Address with prefix length, mask, network, broadcast, usable addresses, source. */
const worked = [
  ['36.40.0.123/16', '255.255.0.0', '36.40.0.0', '36.40.255.255', 65534, 'RFC 950 appendix II, case 1'],
  ['128.99.4.123/22', '255.255.252.0', '128.99.4.0', '128.99.7.255', 1022, 'RFC 950 appendix II, case 2'],
  ['192.168.99.0/24', '255.255.255.0', '192.168.99.0', '192.168.99.255', 254, 'RFC 4632 3.1'],
  ['172.16.0.0/16', '255.255.0.0', '172.16.0.0', '172.16.255.255', 65534, 'RFC 4632 3.1'],
  ['192.168.64.0/19', '255.255.224.0', '192.168.64.0', '192.168.95.255', 8190, 'RFC 4632 5.2'],
  ['10.24.0.0/13', '255.248.0.0', '10.24.0.0', '10.31.255.255', 524286, 'RFC 4632 6.1'],
  ['10.24.0.0/21', '255.255.248.0', '10.24.0.0', '10.24.7.255', 2046, 'RFC 4632 6.1, C1'],
  ['10.24.16.0/20', '255.255.240.0', '10.24.16.0', '10.24.31.255', 4094, 'RFC 4632 6.1, C2'],
  ['10.24.8.0/22', '255.255.252.0', '10.24.8.0', '10.24.11.255', 1022, 'RFC 4632 6.1, C3'],
  ['10.24.12.0/22', '255.255.252.0', '10.24.12.0', '10.24.15.255', 1022, 'RFC 4632 6.1, C4 (its text; the figure misprints /20)'],
  ['10.24.34.0/23', '255.255.254.0', '10.24.34.0', '10.24.35.255', 510, 'RFC 4632 6.1, C6'],
  ['192.168.7.128/25', '255.255.255.128', '192.168.7.128', '192.168.7.255', 126, 'RFC 1878 table 1-2'],
  ['192.168.7.192/26', '255.255.255.192', '192.168.7.192', '192.168.7.255', 62, 'RFC 1878 table 1-2'],
  ['192.168.7.64/27', '255.255.255.224', '192.168.7.64', '192.168.7.95', 30, 'RFC 1878 table 1-2'],
  ['192.168.7.208/28', '255.255.255.240', '192.168.7.208', '192.168.7.223', 14, 'RFC 1878 table 1-2'],
  ['192.168.7.248/29', '255.255.255.248', '192.168.7.248', '192.168.7.255', 6, 'RFC 1878 table 1-2'],
  ['192.168.7.252/30', '255.255.255.252', '192.168.7.252', '192.168.7.255', 2, 'RFC 1878 table 1-2'],
  ['192.168.50.21/28', '255.255.255.240', '192.168.50.16', '192.168.50.31', 14, 'Python ipaddress 3.11'],
  ['10.20.201.77/22', '255.255.252.0', '10.20.200.0', '10.20.203.255', 1022, 'ipcalc 0.42'],
] as const;

describe.each(worked)('%s', (interfaceText, mask, network, broadcast, usable, source) => {
  const [address = '', prefixText = ''] = interfaceText.split('/');
  const prefix = Number(prefixText);
  const subnet = subnetAround(readAddress(address)!, prefix);

  it(`has the network, broadcast and room that ${source} gives`, () => {
    expect([maskOf(prefix), formatAddress(subnet.network), formatAddress(subnet.broadcast), hostCount(subnet)]).toEqual([mask, network, broadcast, usable]);
    expect(readMask(mask)).toBe(prefix);
  });
  it('holds its first and last host, and neither end nor neighbour is one (RFC 1122 3.2.1.3)', () => {
    expect([subnet.network + 1, subnet.broadcast - 1].map((value) => isHostOf(value, subnet))).toEqual([true, true]);
    expect([subnet.network, subnet.broadcast, subnet.network - 1, subnet.broadcast + 1].map((value) => isHostOf(value, subnet))).toEqual([false, false, false, false]);
    expect([subnet.network - 1, subnet.network, subnet.broadcast, subnet.broadcast + 1].map((value) => inSubnet(value, subnet))).toEqual([false, true, true, false]);
  });
  it('is a site’s network only when it is written without host bits', () => {
    const parsed = parseSubnet(interfaceText);
    expect(parsed.ok).toBe(address === network);
    expect(parsed.ok ? null : parsed.instead).toBe(address === network ? null : `${network}/${prefix}`);
  });
});

it('refuses the mask of RFC 950 appendix II, case 3, whose one-bits are not contiguous (RFC 4632 5.1)', () => {
  expect(isValidMask('255.255.255.88')).toBe(false);
  expect(isHoledMask('255.255.255.88')).toBe(true);
});

/** RFC 1878, the table of all masks. */
const masks = [
  [8, '255.0.0.0'], [9, '255.128.0.0'], [10, '255.192.0.0'], [11, '255.224.0.0'], [12, '255.240.0.0'], [13, '255.248.0.0'],
  [14, '255.252.0.0'], [15, '255.254.0.0'], [16, '255.255.0.0'], [17, '255.255.128.0'], [18, '255.255.192.0'], [19, '255.255.224.0'],
  [20, '255.255.240.0'], [21, '255.255.248.0'], [22, '255.255.252.0'], [23, '255.255.254.0'], [24, '255.255.255.0'],
  [25, '255.255.255.128'], [26, '255.255.255.192'], [27, '255.255.255.224'], [28, '255.255.255.240'], [29, '255.255.255.248'],
  [30, '255.255.255.252'], [31, '255.255.255.254'], [32, '255.255.255.255'],
] as const;

describe.each(masks)('/%i is %s (RFC 1878)', (prefix, mask) => {
  it('both ways, with the size the table gives', () => {
    expect(maskOf(prefix)).toBe(mask);
    expect(readMask(mask)).toBe(prefix);
    const around = subnetAround(readAddress('10.0.0.0')!, prefix);
    expect(around.broadcast - around.network + 1).toBe(2 ** (32 - prefix));
  });
  it('is a site’s network from /8 to /30 only (RFC 3021 keeps /31 to point-to-point links, RFC 1878 calls /32 a single host)', () => {
    expect(parseSubnet(`10.0.0.0/${prefix}`).ok).toBe(prefix <= 30);
  });
});

it.each([0, 1, 7])('/%i is wider than any site', (prefix) => {
  expect(parseSubnet(`0.0.0.0/${prefix}`)).toMatchObject({ ok: false, fault: 'prefix' });
});

const python = `
import ipaddress, json, sys
out = []
for address, prefix, other in json.load(sys.stdin):
    net = ipaddress.ip_network((address, prefix), strict=False)
    out.append([int(net.network_address), int(net.broadcast_address), str(net.netmask), ipaddress.IPv4Address(other) in net])
json.dump(out, sys.stdout)
`;

it('agrees with Python and ipaddr.js on random addresses and prefix lengths', () => {
  const cases = fc.sample(fc.tuple(fc.nat(0xffffffff), fc.integer({ min: 0, max: 32 }), fc.nat(0xffffffff), fc.boolean()), { seed: 20261201, numRuns: 3_000 })
    .map(([address, prefix, other, near]) => [address, prefix, near ? (address ^ (other & 0xff)) >>> 0 : other] as const);
  const ours = cases.map(([address, prefix, other]) => {
    const subnet = subnetAround(address, prefix);
    return [subnet.network, subnet.broadcast, maskOf(prefix), inSubnet(other, subnet)];
  });
  expect(ours).toEqual(askPython(python, cases));
  for (const [address, prefix, other] of cases) {
    const there = ipaddr.IPv4.parse(formatAddress(other)).match(ipaddr.IPv4.parse(formatAddress(address)), prefix);
    expect(inSubnet(other, subnetAround(address, prefix))).toBe(there);
  }
});

it('agrees with ipaddr.js on which random texts are masks', () => {
  fc.assert(fc.property(fc.oneof(fc.nat(0xffffffff), fc.integer({ min: 0, max: 32 }).map((prefix) => readAddress(maskOf(prefix))!)), (value) => {
    const text = formatAddress(value);
    expect(readMask(text)).toBe(ipaddr.IPv4.parse(text).prefixLengthFromSubnetMask());
  }), { seed: 20261201, numRuns: 2_000 });
});
