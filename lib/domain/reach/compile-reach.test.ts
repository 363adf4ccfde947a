import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Queue, Till } from '@/lib/domain/site/till';
import { canReach, compileReach } from './compile-reach';
import type { ReachOptions } from './reach';

const reachBetween = (till: Till, printer: Printer, site: Partial<Omit<Site, 'menu'>> = {}, options: ReachOptions = {}) =>
  canReach(aSite({ tills: [till], printers: [printer], ...site }), till.id, printer.id, options);

const grill = aPrinter('GRILL1', '10.20.30.201');
const till1 = aTill('Till 1', 'main', '10.20.30.61');
const printedQueue = (printer: string, more: Partial<Queue> = {}): Queue => ({
  printer: asId(printer), typedName: printer, portKind: 'tcp', portAddress: '', testPrintedAt: '2026-11-20T10:00:00.000Z', ...more,
});

describe('a network printer', () => {
  it('is reached when each one’s mask puts the other in its own network', () => {
    expect(reachBetween(till1, grill)).toMatchObject({ reaches: true, strength: 'worked-out', broken: null, via: null, assumed: false });
  });

  it.each([
    ['the till’s mask is too narrow', { mask: '255.255.255.128' }, {}, 'to-printer', 'The mask of Till 1 is wrong: 255.255.255.128 instead of 255.255.255.0.'],
    ['the printer’s mask is too narrow', {}, { mask: '255.255.255.128' }, 'to-till', 'The mask of GRILL1 is wrong: 255.255.255.128 instead of 255.255.255.0.'],
    ['only the till believes in a wide network', { mask: '255.255.0.0' }, { address: '10.20.31.201' }, 'to-till', 'The mask of Till 1 is wrong: 255.255.0.0 instead of 255.255.255.0.'],
    ['only the printer believes in a wide network', {}, { address: '10.20.31.201', mask: '255.255.0.0' }, 'to-printer', 'The mask of GRILL1 is wrong'],
    ['both masks keep them apart', {}, { address: '10.20.31.201' }, 'both', '10.20.30.61 and 10.20.31.201'],
  ] as const)('is not reached when %s, and the broken direction is named', (_, till, printer, broken, words) => {
    const reach = reachBetween({ ...till1, ...till }, { ...grill, ...printer });
    expect(reach).toMatchObject({ reaches: false, broken });
    expect(reach.why).toContain(words);
  });

  it.each([
    ['no address', { address: '' }, 'GRILL1 has no address yet.'],
    ['a shortened address', { address: '10.20.201' }, 'which is not an address'],
    ['a self-assigned address', { address: '169.254.3.7' }, 'which no device can be reached at'],
    ['a broadcast address', { address: '10.20.30.255' }, "is no device's address"],
    ['a mask with a hole', { mask: '255.255.255.88' }, 'which is not a mask'],
  ] as const)('is not reached with %s', (_, printer, words) => {
    const reach = reachBetween(till1, { ...grill, ...printer });
    expect(reach.reaches).toBe(false);
    expect(reach.why).toContain(words);
  });
});

describe('a till whose address the router gives', () => {
  const roaming = aTill('Till 1', 'main', '', { addressSource: 'dhcp', mask: '' });

  it('counts as in the site’s subnet, and the answer says it is assumed', () => {
    expect(reachBetween(roaming, grill)).toMatchObject({ reaches: true, assumed: true });
  });
  it('does not reach a printer outside the subnet', () => {
    expect(reachBetween(roaming, { ...grill, address: '10.20.31.201' })).toMatchObject({ reaches: false, broken: 'both' });
  });
  it('does not reach a printer whose mask leaves out a part of the subnet', () => {
    expect(reachBetween(roaming, { ...grill, mask: '255.255.255.128' })).toMatchObject({ reaches: false, broken: 'to-till' });
  });
  it('reaches nothing while nobody has said what the subnet is', () => {
    expect(reachBetween(roaming, grill, { network: { subnet: '', gateway: '', poolFrom: '', poolTo: '', reserved: [] } }).reaches).toBe(false);
  });
  it('is taken by its address once that is known', () => {
    expect(reachBetween({ ...roaming, address: '10.20.31.5' }, grill).reaches).toBe(false);
  });
});

describe('a till that prints through another', () => {
  const usb = aPrinter('BAR2', '', { connection: 'usb', hostTill: asId('Terrace') });
  const terrace = aTill('Terrace', 'terrace', '10.20.30.64');
  const handheld = aTill('Handheld 1', 'terrace', '', { kind: 'handheld', printsThrough: asId('Terrace') });
  const second = aTill('Handheld 2', 'terrace', '', { kind: 'handheld', printsThrough: asId('Handheld 1') });
  const site = aSite({ tills: [till1, terrace, handheld, second], printers: [grill, usb] });

  it('reaches what that one reaches, plugged-in printers included, through a chain too', () => {
    const reach = compileReach(site);
    for (const till of [handheld, second]) {
      expect(reach(till.id, grill.id)).toMatchObject({ reaches: true, via: 'Terrace' });
      expect(reach(till.id, usb.id)).toMatchObject({ reaches: true, via: 'Terrace' });
    }
  });
  it('reaches nothing in a circle', () => {
    const circle = aSite({ ...site, tills: [{ ...handheld, printsThrough: second.id }, second], printers: [grill] });
    expect(canReach(circle, second.id, grill.id)).toMatchObject({ reaches: false });
    expect(canReach(circle, second.id, grill.id).why).toContain('circle');
  });
  it('reaches nothing while the other is off', () => {
    const reach = compileReach(site, { offTills: [terrace.id] });
    expect(reach(handheld.id, grill.id).reaches).toBe(false);
    expect(reach(second.id, usb.id).reaches).toBe(false);
    expect(reach(till1.id, grill.id).reaches).toBe(true);
  });
});

describe.each(['usb', 'serial', 'parallel'] as const)('a %s printer', (connection) => {
  const cabled = aPrinter('BAR2', '', { connection, hostTill: asId('Terrace') });
  const site = aSite({ tills: [till1, aTill('Terrace', 'terrace', '')], printers: [cabled] });

  it('prints from its host till, whatever that till’s address, and from no other', () => {
    const reach = compileReach(site);
    expect(reach(asId('Terrace'), cabled.id).reaches).toBe(true);
    expect(reach(till1.id, cabled.id).reaches).toBe(false);
  });
  it('prints from nowhere without a host till', () => {
    expect(canReach({ ...site, printers: [{ ...cabled, hostTill: null }] }, asId('Terrace'), cabled.id).reaches).toBe(false);
  });
});

describe('an online channel', () => {
  const channel = aTill('Web orders', 'main', '', { kind: 'online' });
  const usb = aPrinter('BAR2', '', { connection: 'usb', hostTill: asId('Till 1') });
  const siteWith = (link: Site['link']) => aSite({ tills: [till1, channel], printers: [grill, usb], link });

  it('reaches nothing without a print link', () => {
    expect(canReach(siteWith({ kind: 'none' }), channel.id, grill.id).reaches).toBe(false);
  });
  it('reaches what the link’s till reaches, its plugged-in printers included', () => {
    const reach = compileReach(siteWith({ kind: 'till', till: till1.id }));
    expect(reach(channel.id, grill.id)).toMatchObject({ reaches: true, via: 'Till 1' });
    expect(reach(channel.id, usb.id).reaches).toBe(true);
  });
  it('reaches the network, and nothing plugged in, from a link with an address of its own', () => {
    const reach = compileReach(siteWith({ kind: 'own', address: '10.20.30.5', mask: '255.255.255.0' }));
    expect(reach(channel.id, grill.id).reaches).toBe(true);
    expect(reach(channel.id, usb.id).reaches).toBe(false);
  });
  it('reaches nothing when the link’s till is off', () => {
    expect(canReach(siteWith({ kind: 'till', till: till1.id }), channel.id, grill.id, { offTills: [till1.id] }).reaches).toBe(false);
  });
});

describe('what was measured', () => {
  const far = { ...grill, address: '10.99.30.201' };

  it('wins over what was worked out, and says that they disagree', () => {
    const reach = reachBetween({ ...till1, queues: [printedQueue('GRILL1')] }, far);
    expect(reach).toMatchObject({ reaches: true, strength: 'printed', measuredAt: '2026-11-20T10:00:00.000Z' });
    expect(reach.why).toContain('should not reach it');
  });
  it('is quiet about agreeing', () => {
    expect(reachBetween({ ...till1, queues: [printedQueue('GRILL1')] }, grill).why).toBe('A test from Till 1 printed on GRILL1.');
  });
  it('lets a missing answer overrule working out', () => {
    const reach = reachBetween(till1, grill, {}, { answers: [{ till: till1.id, printer: grill.id, answers: false, at: '2026-11-21T10:00:00.000Z' }] });
    expect(reach).toMatchObject({ reaches: false, strength: 'answered' });
  });
  it.each([
    ['before it', '2026-11-19T10:00:00.000Z', true, 'printed'],
    ['after it', '2026-11-21T10:00:00.000Z', false, 'answered'],
  ] as const)('keeps a printed test against a missing answer from %s only if that came first', (_, at, reaches, strength) => {
    const reach = reachBetween({ ...till1, queues: [printedQueue('GRILL1')] }, grill, {}, { answers: [{ till: till1.id, printer: grill.id, answers: false, at }] });
    expect(reach).toMatchObject({ reaches, strength });
  });
  it('does not print through a till that is off', () => {
    const shared = { ...till1, queues: [printedQueue('BAR2', { portKind: 'shared' })] };
    const usb = aPrinter('BAR2', '', { connection: 'usb', hostTill: asId('Terrace') });
    const site = aSite({ tills: [shared, aTill('Terrace', 'terrace', '10.20.30.64')], printers: [usb] });
    expect(canReach(site, shared.id, usb.id)).toMatchObject({ reaches: true, strength: 'printed' });
    expect(canReach(site, shared.id, usb.id, { offTills: [asId('Terrace')] }).reaches).toBe(false);
  });
});

it('answers for a till or printer that is gone instead of failing', () => {
  expect(canReach(aSite(), asId('gone'), asId('gone')).reaches).toBe(false);
});
