import { describe, expect, it } from 'vitest';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import type { Queue, Till } from '@/lib/domain/site/till';
import { checkPrinterDraft, checkTillDraft } from './check-draft';
import { checkSite } from './check-site';

const queuesFor = (...printers: readonly string[]): readonly Queue[] =>
  printers.map((printer) => ({ printer: asId(printer), typedName: printer, portKind: 'tcp', portAddress: '', testPrintedAt: null }));
const till = (name: string, last: number, more: Partial<Till> = {}) => aTill(name, 'main', `10.20.30.${last}`, { queues: queuesFor('GRILL1', 'SAUCE1', 'PASS1'), ...more });

const plan = aPlan([
  aRule('cook', 'send', { kind: 'section', section: asId('grills') }, ['Grill']),
  aRule('bar', 'send', { kind: 'section', section: asId('drinks') }, ['Bar'], { tills: [asId('Till 2')] }),
  aRule('pass', 'copy', { kind: 'everything' }, ['Pass']),
]);
const well: Site = aSite({
  areas: [{ id: asId('main'), name: 'Main room', version: 1 }],
  printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('SAUCE1') }), aPrinter('SAUCE1', '10.20.30.203'), aPrinter('BAR1', '10.20.30.205'), aPrinter('PASS1', '10.20.30.210')],
  stations: [aStation('Grill', ['GRILL1']), aStation('Sauce', ['SAUCE1']), aStation('Bar', ['BAR1']), aStation('Pass', ['PASS1'], { kind: 'pass' })],
  tills: [till('Till 1', 61), till('Till 2', 62, { queues: queuesFor('GRILL1', 'SAUCE1', 'PASS1', 'BAR1') })],
  menu: { sections: [aSection('grills'), aSection('drinks')], items: [anItem('steak', 'grills'), anItem('cider', 'drinks')] },
  plans: [plan],
});
const codesOf = (site: Site) => checkSite(site, plan).map((finding) => `${finding.severity} ${finding.code} ${finding.subject.id}`);

it('a site in good order has nothing to be said of it', () => {
  expect(checkSite(well, plan)).toEqual([]);
});

it('puts what stops a plan before what wants a look, whatever it is about', () => {
  const site = { ...well, printers: well.printers.map((printer) => (printer.id === 'PASS1' ? { ...printer, port: 9101, name: 'PASS 1' } : printer)) };
  expect(codesOf(site)).toEqual(['stop name-space PASS1', 'stop queue-typed-differently PASS1', 'stop queue-typed-differently PASS1', 'check port-unusual PASS1']);
});

describe('a queue that is missing', () => {
  const without = (tillName: string, printer: string): Site => ({ ...well, tills: well.tills.map((one) => (one.name === tillName ? { ...one, queues: one.queues.filter((queue) => queue.printer !== printer) } : one)) });

  it('is a stop where the plan prints, and a check where a backup would', () => {
    expect(codesOf(without('Till 1', 'GRILL1'))).toEqual(['stop queue-missing GRILL1']);
    expect(codesOf(without('Till 1', 'PASS1'))).toEqual(['stop queue-missing PASS1']);
    expect(codesOf(without('Till 1', 'SAUCE1'))).toEqual(['check queue-missing-backup SAUCE1']);
    expect(codesOf(without('Till 2', 'BAR1'))).toEqual(['stop queue-missing BAR1']);
  });
  it('offers the queue as it should be', () => {
    expect(checkSite(without('Till 1', 'GRILL1'), plan)[0]?.fixes).toEqual([
      { kind: 'add-queue', till: 'Till 1', printer: 'GRILL1', name: 'GRILL1', portKind: 'tcp', portAddress: '10.20.30.201:9100', label: 'Till 1 has GRILL1 now' },
    ]);
  });
  it('is not missed where the plan sends nothing from that till, nor without a plan', () => {
    expect(codesOf(well).filter((code) => code.includes('BAR1'))).toEqual([]);
    expect(checkSite(without('Till 1', 'GRILL1'))).toEqual([]);
  });
  it('of a handheld is its till’s', () => {
    const handheld = aTill('Handheld', 'main', '', { kind: 'handheld', printsThrough: asId('Till 1'), addressSource: 'dhcp' });
    const site = { ...without('Till 1', 'GRILL1'), tills: [...without('Till 1', 'GRILL1').tills, handheld] };
    expect(checkSite(site, plan).map((finding) => finding.subject)).toEqual([{ kind: 'queue', id: 'GRILL1', till: 'Till 1', field: 'queues' }]);
  });
  it('of an online channel is nobody’s: the link carries its tickets', () => {
    const web = aTill('Web', 'main', '', { kind: 'online' });
    expect(codesOf({ ...well, tills: [...well.tills, web], link: { kind: 'till', till: asId('Till 1') } })).toEqual([]);
  });
});

describe('a printer that has never printed a test', () => {
  const untested: Site = { ...well, printers: well.printers.map((printer) => (printer.id === 'GRILL1' ? { ...printer, stage: 'reachable' as const } : printer)) };
  it('is to be looked at', () => {
    expect(checkSite(untested, plan)).toMatchObject([{ code: 'never-tested', severity: 'check', title: 'GRILL1 has never printed a test', subject: { kind: 'printer', id: 'GRILL1' }, fixes: [{ kind: 'print-test', label: 'Print a test' }] }]);
  });
  it('has, once one test from any till came out', () => {
    const printed = { ...untested, tills: untested.tills.map((one) => ({ ...one, queues: one.queues.map((queue) => ({ ...queue, testPrintedAt: '2026-11-20T10:00:00.000Z' })) })) };
    expect(codesOf(printed)).toEqual([]);
  });
});

it('offers each of two devices without an address one of its own', () => {
  const site = { ...well, printers: well.printers.map((printer) => (printer.id === 'GRILL1' || printer.id === 'BAR1' ? { ...printer, address: '' } : printer)) };
  const offered = checkSite(site).flatMap((finding) => finding.fixes.flatMap((fix) => (fix.kind === 'set-printer-address' ? [fix.address] : [])));
  expect(offered).toEqual(['10.20.30.211', '10.20.30.212']);
});

it.each([
  ['no host till', { connection: 'usb' as const, hostTill: null }, 'host-missing'],
  ['an online channel as its host', { connection: 'serial' as const, hostTill: asId<Till['id']>('Web') }, 'host-online'],
])('a printer on a cable with %s stops', (_, more, code) => {
  const site = { ...well, tills: [...well.tills, aTill('Web', 'main', '', { kind: 'online' })], printers: well.printers.map((printer) => (printer.id === 'BAR1' ? { ...printer, ...more } : printer)) };
  expect(checkSite(site).map((finding) => finding.code)).toContain(code);
});

it('a circle of tills that print through each other stops', () => {
  const circle = [till('Till 1', 61, { printsThrough: asId('Till 2') }), till('Till 2', 62, { printsThrough: asId('Till 1') })];
  expect(checkSite({ ...well, tills: circle }).map((finding) => [finding.code, finding.subject.id])).toEqual([['prints-through-circle', 'Till 1'], ['prints-through-circle', 'Till 2']]);
});

describe('while typing', () => {
  it('a printer form hears of its own field, and has to give way', () => {
    const draft = aPrinter('grill1', '10.20.30.62', { id: asId('new'), mask: '255.255.0.0', port: 9101, stage: 'signed-off' });
    expect(checkPrinterDraft(well, draft).map((finding) => [finding.subject.field, finding.code])).toEqual([
      ['name', 'name-taken'], ['address', 'address-taken'], ['mask', 'mask-differs'], ['port', 'port-unusual'],
    ]);
  });
  it('a printer form compares with the others, not with its own earlier self', () => {
    expect(checkPrinterDraft(well, { ...well.printers[0]!, address: '10.20.30.220' })).toEqual([]);
  });
  it('a till form hears of its address and of each queue row', () => {
    const draft = till('Till 3', 201, { queues: [...queuesFor('GRILL1'), { ...queuesFor('PASS1')[0]!, typedName: 'PASS 1' }], defaultPrinter: asId('BAR1') });
    expect(checkTillDraft(well, draft).map((finding) => finding.subject.field)).toEqual(['address', 'queues.1.typedName', 'defaultPrinter']);
  });
});
