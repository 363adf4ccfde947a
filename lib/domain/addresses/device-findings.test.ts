import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import { networkFindings } from './network-findings';
import { printerAddressFindings } from './printer-findings';
import { tillAddressFindings } from './till-findings';

const network: Site['network'] = { subnet: '10.20.30.0/24', gateway: '10.20.30.1', poolFrom: '10.20.30.100', poolTo: '10.20.30.150', reserved: [{ address: '10.20.30.240', reason: 'Music player' }, { address: '10.20.30.120', reason: 'GRILL1, hot line' }] };
const sauce = aPrinter('SAUCE1', '10.20.30.203');
const till1 = aTill('Till 1', 'main', '10.20.30.61');
const judge = (printer: Partial<Printer>, more: Partial<Omit<Site, 'menu'>> = {}) => {
  const grill = aPrinter('GRILL1', '10.20.30.201', { stage: 'planned', ...printer });
  return printerAddressFindings(aSite({ network, printers: [sauce, grill], tills: [till1], ...more }), grill);
};

describe('a printer’s address', () => {
  it('that is good has nothing to be said of it', () => {
    expect(judge({})).toEqual([]);
  });

  it.each([
    ['', 'address-missing'], ['10.20.201', 'address-form'], ['fe80::1', 'address-form'], ['10.20.31.5', 'address-outside'],
    ['10.20.30.0', 'address-of-network'], ['10.20.30.255', 'address-of-broadcast'], ['10.20.30.1', 'address-of-gateway'],
    ['10.20.30.203', 'address-taken'], ['10.20.30.61', 'address-taken'], ['10.20.30.240', 'address-reserved'], ['169.254.7.7', 'address-range'],
    ['127.0.0.1', 'address-range'], ['224.0.0.5', 'address-range'], ['192.0.2.9', 'address-range'],
  ])('%j is a stop (%s), with an address that mends it', (address, code) => {
    const findings = judge({ address });
    expect(findings.map((finding) => [finding.code, finding.severity, finding.subject.field])).toEqual([[code, 'stop', 'address']]);
    const [fix] = findings[0]!.fixes;
    expect(fix).toMatchObject({ kind: 'set-printer-address', printer: 'GRILL1' });
    expect(fix?.kind === 'set-printer-address' && judge({ address: fix.address })).toEqual([]);
  });

  it('offers what was meant before a new one', () => {
    expect(judge({ address: '10.20.30.077' })[0]?.fixes).toMatchObject([{ address: '10.20.30.77' }]);
    expect(judge({ address: '10.20.30.0203' })[0]?.fixes).toMatchObject([{ address: '10.20.30.204' }]);
  });

  it('in the pool asks for a reservation or a move', () => {
    const [finding] = judge({ address: '10.20.30.110' });
    expect(finding).toMatchObject({ code: 'address-in-pool', severity: 'check' });
    expect(finding?.fixes.map((fix) => fix.kind)).toEqual(['set-printer-address', 'reserve-address']);
  });
  it('in the pool is well when the router keeps it for this printer', () => {
    expect(judge({ address: '10.20.30.120' })).toEqual([]);
  });
  it('kept for a printer of another name is not its own', () => {
    expect(judge({ address: '10.20.30.120', name: 'GRILL11' })[0]).toMatchObject({ code: 'address-reserved' });
  });
  it.each([['8.20.30.0/24', '8.20.30.201'], ['100.64.1.0/24', '100.64.1.201']])('in %s is looked at', (subnet, address) => {
    const findings = judge({ address, gateway: '' }, { network: { ...network, subnet, gateway: '', poolFrom: '', poolTo: '' }, printers: [] });
    expect(findings).toMatchObject([{ code: 'address-not-private', severity: 'check' }]);
  });
  it('that two have is for the one less far along to change, or for the one being typed', () => {
    const first = aPrinter('A', '10.20.30.201', { stage: 'planned' });
    const second = aPrinter('B', '10.20.30.201', { stage: 'signed-off' });
    const site = aSite({ network, printers: [first, second] });
    expect([printerAddressFindings(site, first).length, printerAddressFindings(site, second).length]).toEqual([1, 0]);
    expect(printerAddressFindings(site, second, { yields: true })).toMatchObject([{ code: 'address-taken' }]);
  });
});

it.each([
  ['', 'mask-missing'], ['255.255.255.88', 'mask-holed'], ['24', 'mask-form'], ['255.255.255', 'mask-form'], ['255.255.0.0', 'mask-differs'],
])('the mask %j is a stop (%s), mended by the site’s', (mask, code) => {
  expect(judge({ mask })).toMatchObject([{ code, severity: 'stop', subject: { field: 'mask' }, fixes: [{ kind: 'set-printer-mask', mask: '255.255.255.0' }] }]);
});

it.each([
  [{ port: 9101 }, 'port-unusual', { kind: 'set-printer-port', port: 9100 }],
  [{ gateway: '10.20.30.254' }, 'gateway-differs', { kind: 'set-printer-gateway', gateway: '10.20.30.1' }],
  [{ mac: '00:1B:44' }, 'mac-form', { kind: 'set-printer-mac', mac: '' }],
] as const)('%j is looked at', (printer, code, fix) => {
  expect(judge(printer)).toMatchObject([{ code, severity: 'check', fixes: [fix] }]);
});

it('the same MAC twice is looked at, however it is written', () => {
  const twice = { printers: [aPrinter('SAUCE1', '10.20.30.203', { mac: '00:1b:44:11:3a:b7' })] };
  expect(judge({ mac: '001B.4411.3AB7' }, twice)).toMatchObject([{ code: 'mac-twice', severity: 'check' }]);
});

it('a printer on a cable has no address to be wrong', () => {
  expect(judge({ connection: 'usb', hostTill: asId('Till 1'), address: '', mask: '' })).toEqual([]);
});

describe('a till', () => {
  const judgeTill = (more: Parameters<typeof aTill>[3], address = '10.20.30.62') => {
    const till = aTill('Till 2', 'main', address, more);
    return tillAddressFindings(aSite({ network, printers: [sauce], tills: [till1, till] }), till).map((finding) => [finding.code, finding.severity]);
  };
  it.each([
    ['static and good', {}, '10.20.30.62', []],
    ['static without an address', {}, '', [['address-missing', 'stop']]],
    ['static in the pool', {}, '10.20.30.110', [['address-in-pool', 'check']]],
    ['on the router’s address', { addressSource: 'dhcp' as const, mask: '' }, '10.20.30.110', []],
    ['without a known address', { addressSource: 'dhcp' as const, mask: '' }, '', [['till-address-unknown', 'check']]],
    ['that got no address', { addressSource: 'dhcp' as const, mask: '' }, '169.254.9.9', [['till-self-assigned', 'stop']]],
    ['with a printer’s address', {}, '10.20.30.203', []],
    ['with another mask', { mask: '255.255.0.0' }, '10.20.30.62', [['mask-differs', 'stop']]],
    ['online', { kind: 'online' as const }, '', []],
    ['that prints through another', { printsThrough: asId<Site['tills'][number]['id']>('Till 1'), addressSource: 'static' as const }, '', []],
  ])('%s', (_, more, address, expected) => {
    expect(judgeTill(more, address)).toEqual(expected);
  });
});

describe('the network', () => {
  const judgeNetwork = (change: Partial<Site['network']>, more: Partial<Omit<Site, 'menu'>> = {}) =>
    networkFindings(aSite({ network: { ...network, ...change }, printers: [sauce], tills: [till1], ...more })).map((finding) => [finding.code, finding.severity, finding.subject.field]);

  it('that is good has nothing to be said of it', () => {
    expect(judgeNetwork({})).toEqual([]);
  });
  it.each([
    [{ subnet: '' }, 'subnet-missing', 'stop', 'subnet'], [{ subnet: '10.20.30.5/24' }, 'subnet-form', 'stop', 'subnet'],
    [{ subnet: '10.20.30.0/31' }, 'subnet-form', 'stop', 'subnet'], [{ gateway: '' }, 'gateway-missing', 'note', 'gateway'],
    [{ gateway: '10.20.31.1' }, 'gateway-outside', 'stop', 'gateway'], [{ gateway: '10.20.30.255' }, 'gateway-outside', 'stop', 'gateway'],
    [{ gateway: '10.20.30.001' }, 'gateway-form', 'stop', 'gateway'],
    [{ poolTo: '' }, 'pool-form', 'stop', 'poolTo'], [{ poolFrom: '10.20.30.160' }, 'pool-reversed', 'stop', 'poolFrom'],
    [{ poolTo: '10.20.31.5' }, 'pool-outside', 'stop', 'poolFrom'], [{ poolFrom: '10.20.30.1' }, 'pool-holds-gateway', 'check', 'poolFrom'],
    [{ reserved: [{ address: '10.20.30', reason: 'X' }] }, 'reserved-form', 'stop', 'reserved.0.address'],
    [{ reserved: [{ address: '10.20.31.9', reason: 'X' }] }, 'reserved-outside', 'check', 'reserved.0.address'],
    [{ reserved: [{ address: '10.20.30.9', reason: 'X' }, { address: '10.20.30.9', reason: 'Y' }] }, 'reserved-twice', 'check', 'reserved.1.address'],
  ] as const)('%j: %s', (change, code, severity, field) => {
    expect(judgeNetwork(change)).toEqual([[code, severity, field]]);
  });
  it('offers the network that most devices are in', () => {
    const [finding] = networkFindings(aSite({ network: { ...network, subnet: '' }, printers: [sauce], tills: [till1] }));
    expect(finding?.fixes).toMatchObject([{ kind: 'set-network', change: { subnet: '10.20.30.0/24' } }]);
  });
  it('holds the print link’s own address to the same rules', () => {
    expect(judgeNetwork({}, { link: { kind: 'own', address: '10.20.30.203', mask: '255.255.255.0' } })).toEqual([]);
    expect(judgeNetwork({}, { link: { kind: 'own', address: '10.20.31.9', mask: '255.255.255.0' } })).toEqual([['link-address-outside', 'stop', 'link.address']]);
    expect(judgeNetwork({}, { link: { kind: 'own', address: '10.20.30.5', mask: '' } })).toEqual([['link-mask-missing', 'stop', 'link.mask']]);
  });
});
