import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aTill } from '@/tests/fixtures/build-site';
import { nextFreeAddress } from './next-free-address';
import { readAddress } from './read-address';
import { isHostOf, readSubnet } from './subnet';
import { inPool, readPool } from './taken-addresses';

const network = { subnet: '10.20.30.0/24', gateway: '10.20.30.1', poolFrom: '10.20.30.100', poolTo: '10.20.30.150', reserved: [] };
const printersAt = (...lasts: readonly number[]) => lasts.map((last) => aPrinter(`P${last}`, `10.20.30.${last}`));
const tillsAt = (...lasts: readonly number[]) => lasts.map((last) => aTill(`Till ${last}`, 'main', `10.20.30.${last}`));

describe('the next free address', () => {
  it.each([
    ['follows the end of the printers’ block', { printers: printersAt(201, 202, 210) }, 'printer', '10.20.30.211'],
    ['follows the end of the tills’ block', { tills: tillsAt(61, 65) }, 'till', '10.20.30.66'],
    ['starts a block of its own', {}, 'printer', '10.20.30.201'],
    ['starts the tills apart from the printers', {}, 'till', '10.20.30.61'],
    ['steps over the pool', { tills: tillsAt(99) }, 'till', '10.20.30.151'],
    ['steps over the gateway', { network: { ...network, gateway: '10.20.30.202' }, printers: printersAt(201) }, 'printer', '10.20.30.203'],
    ['steps over what is reserved', { network: { ...network, reserved: [{ address: '10.20.30.202', reason: 'Music player' }] }, printers: printersAt(201) }, 'printer', '10.20.30.203'],
    ['steps over tills', { printers: printersAt(201), tills: tillsAt(202) }, 'printer', '10.20.30.203'],
    ['steps over where a printer still answers', { printers: [aPrinter('P201', '10.20.30.201', { presentAddress: '10.20.30.202' })] }, 'printer', '10.20.30.203'],
    ['turns back at the end of the network', { printers: printersAt(253, 254) }, 'printer', '10.20.30.252'],
    ['is not led astray by a printer that has to move', { printers: [...printersAt(201), aPrinter('stray', '10.20.31.230'), aPrinter('pooled', '10.20.30.120')] }, 'printer', '10.20.30.202'],
    ['fits a small network', { network: { subnet: '10.20.30.0/29', gateway: '10.20.30.1', poolFrom: '', poolTo: '', reserved: [] } }, 'printer', '10.20.30.6'],
    ['is none without a subnet', { network: { ...network, subnet: '' } }, 'printer', null],
    ['is none in a network that no device may have', { network: { ...network, subnet: '192.0.2.0/24' } }, 'printer', null],
  ] as const)('%s', (_, more, kind, address) => {
    expect(nextFreeAddress(aSite({ network, ...more }), kind)).toBe(address);
  });

  it('leaves out what has been promised to others', () => {
    expect(nextFreeAddress(aSite({ network, printers: printersAt(201) }), 'printer', ['10.20.30.202', '10.20.30.203'])).toBe('10.20.30.204');
  });
  it('is none when nothing is left', () => {
    const full = { subnet: '10.20.30.0/30', gateway: '10.20.30.1', poolFrom: '', poolTo: '', reserved: [] };
    expect(nextFreeAddress(aSite({ network: full, printers: printersAt(2) }), 'printer')).toBeNull();
  });
});

it('is always a free host outside the pool, and none only when there is none', () => {
  const small = fc.record({
    prefix: fc.integer({ min: 26, max: 30 }), gateway: fc.nat(63), poolFrom: fc.nat(63), poolTo: fc.nat(63),
    printers: fc.uniqueArray(fc.nat(63), { maxLength: 40 }), tills: fc.uniqueArray(fc.nat(63), { maxLength: 20 }), kind: fc.constantFrom('printer' as const, 'till' as const),
  });
  fc.assert(fc.property(small, ({ prefix, gateway, poolFrom, poolTo, printers, tills, kind }) => {
    const site = aSite({
      network: { subnet: `10.20.30.0/${prefix}`, gateway: `10.20.30.${gateway}`, poolFrom: `10.20.30.${poolFrom}`, poolTo: `10.20.30.${poolTo}`, reserved: [] },
      printers: printersAt(...printers), tills: tillsAt(...tills),
    });
    const subnet = readSubnet(site.network.subnet)!;
    const taken = new Set([gateway, ...printers, ...tills].map((last) => readAddress(`10.20.30.${last}`)));
    const free = Array.from({ length: 64 }, (_, last) => readAddress(`10.20.30.${last}`)!)
      .filter((address) => isHostOf(address, subnet) && !taken.has(address) && !inPool(address, readPool(site.network)));
    const found = nextFreeAddress(site, kind);
    expect(found === null ? free.length === 0 : free.includes(readAddress(found)!)).toBe(true);
    expect(nextFreeAddress(site, kind)).toBe(found);
  }), { seed: 20261201, numRuns: 500 });
});
