import { beforeEach, describe, expect, it } from 'vitest';
import { isRowFix, type RowFix } from '@/features/fixes/row-fix';
import { fixInput } from '@/features/fixes/schema';
import { applyFix } from '@/features/fixes/server/apply-fix';
import { checkSite } from '@/lib/domain/checks/check-site';
import type { Finding } from '@/lib/domain/findings/finding';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Site } from '@/lib/domain/site/site';
import type { Actor } from '@/lib/server/actor';
import { inTransaction } from '@/lib/server/database';
import { lastChangeOf } from '@/lib/server/history';
import { loadSite } from '@/lib/server/site-snapshot';
import { PrinterRow } from '@/models/printer';
import { QueueRow } from '@/models/queue';
import { SiteRow } from '@/models/site';
import { TillRow } from '@/models/till';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const as = (role: Role): Actor => ({ person: { id: 'femi-lindqvist', name: 'Femi Lindqvist', email: '' }, membership: { role, mayOverride: false, title: '' }, siteId });

const site = async (): Promise<Site> => {
  const loaded = await loadSite(siteId);
  if (loaded === null) throw new Error('The demo has no Lantern Yard.');
  return loaded;
};
const found = async (): Promise<readonly Finding[]> => {
  const now = await site();
  return checkSite(now, now.plans.find((plan) => plan.name === 'Dinner'));
};
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);

/** Things that go wrong on a site, each as the rows would say it. */
const mishaps: readonly (readonly [string, () => Promise<unknown>, string])[] = [
  ['a printer lost its address', () => PrinterRow.update({ address: '' }, { where: { siteId, id: 'grill1' } }), 'address-missing'],
  ['an address was typed short', () => PrinterRow.update({ address: '10.20.201' }, { where: { siteId, id: 'grill1' } }), 'address-form'],
  ['two printers have one address', () => PrinterRow.update({ address: '10.20.30.203' }, { where: { siteId, id: 'pastry1' } }), 'address-taken'],
  ['a printer stands in the pool', () => PrinterRow.update({ address: '10.20.30.110' }, { where: { siteId, id: 'grill1' } }), 'address-in-pool'],
  ['a mask is wrong', () => PrinterRow.update({ mask: '255.255.0.0' }, { where: { siteId, id: 'grill1' } }), 'mask-differs'],
  ['a port is unusual', () => PrinterRow.update({ port: 9101 }, { where: { siteId, id: 'grill1' } }), 'port-unusual'],
  ['a gateway is not the site’s', () => PrinterRow.update({ gateway: '10.20.30.9' }, { where: { siteId, id: 'grill1' } }), 'gateway-differs'],
  ['a MAC was misread', () => PrinterRow.update({ mac: '00:1B' }, { where: { siteId, id: 'grill1' } }), 'mac-form'],
  ['a till has a printer’s address', () => TillRow.update({ address: '10.20.30.1' }, { where: { siteId, id: 'till-1' } }), 'address-of-gateway'],
  ['a till’s mask is wrong', () => TillRow.update({ mask: '255.0.0.0' }, { where: { siteId, id: 'till-1' } }), 'mask-differs'],
  ['a till prints through itself', () => TillRow.update({ printsThroughId: 'till-1' }, { where: { siteId, id: 'till-1' } }), 'prints-through-circle'],
  ['a ticket printer is the default', () => TillRow.update({ defaultPrinterId: 'pass1' }, { where: { siteId, id: 'till-1' } }), 'till-default-printer'],
  ['a queue is typed differently', () => QueueRow.update({ typedName: 'grill1' }, { where: { siteId, tillId: 'till-1', printerId: 'grill1' } }), 'queue-typed-differently'],
  ['a queue goes to a parallel port', () => QueueRow.update({ portKind: 'parallel', portAddress: 'LPT1:' }, { where: { siteId, tillId: 'till-1', printerId: 'grill1' } }), 'queue-parallel-nothing'],
  ['a queue goes elsewhere', () => QueueRow.update({ portAddress: '10.20.30.99:9100' }, { where: { siteId, tillId: 'till-1', printerId: 'grill1' } }), 'queue-port-elsewhere'],
  ['a queue is shared', () => QueueRow.update({ portKind: 'shared' }, { where: { siteId, tillId: 'till-1', printerId: 'grill1' } }), 'queue-shared'],
  ['a queue is missing', () => QueueRow.destroy({ where: { siteId, tillId: 'till-1', printerId: 'grill1' } }), 'queue-missing'],
  ['the subnet names a device', () => SiteRow.update({ subnet: '10.20.30.7/24' }, { where: { id: siteId } }), 'subnet-form'],
  ['the pool is reversed', () => SiteRow.update({ poolFrom: '10.20.30.150', poolTo: '10.20.30.100' }, { where: { id: siteId } }), 'pool-reversed'],
  ['the print link has a printer’s address', () => SiteRow.update({ linkKind: 'own', linkAddress: '10.20.31.4', linkMask: '255.255.255.0' }, { where: { id: siteId } }), 'link-address-outside'],
];

describe('one press', () => {
  it.each(mishaps)('mends it when %s', async (_what, happen, code) => {
    const well = new Set((await found()).map((finding) => `${finding.code} ${finding.subject.id}`));
    await happen();
    const finding = (await found()).find((one) => one.code === code && !well.has(`${one.code} ${one.subject.id}`));
    const fix = finding?.fixes.find(isRowFix);
    expect(fix, `no fix for ${code}`).toBeDefined();
    expect(fixInput.parse(fix)).toEqual(fix);
    await applyFix(as('installer'), fix as RowFix);
    expect((await found()).filter((one) => one.code === code && one.subject.id === finding?.subject.id && one.subject.till === finding?.subject.till)).toEqual([]);
  });

  it('renames a printer, and then all tills at once', async () => {
    const larder = (await site()).printers.find((printer) => printer.name === 'LARDER 1')!;
    await applyFix(as('owner'), { kind: 'rename-printer', printer: larder.id, name: 'LARDER1', label: '' });
    expect(await lastChangeOf(siteId, 'printer', larder.id)).toMatchObject({ summary: 'LARDER 1 renamed to LARDER1' });
    const all = (await found()).flatMap((finding) => finding.fixes).find((fix) => fix.kind === 'rename-queues');
    if (all !== undefined) await applyFix(as('owner'), all as RowFix);
    expect((await found()).filter((finding) => finding.subject.id === larder.id && finding.code.startsWith('queue-typed'))).toEqual([]);
  });

  it('reserves an address once', async () => {
    const reserve: RowFix = { kind: 'reserve-address', address: '10.20.30.120', reason: 'GRILL1', label: '' };
    await applyFix(as('installer'), reserve);
    expect((await site()).network.reserved).toContainEqual({ address: '10.20.30.120', reason: 'GRILL1' });
    expect(await refused(applyFix(as('installer'), reserve))).toMatchObject({ code: 'conflict' });
  });

  it('sets a stand-in and a backup', async () => {
    await applyFix(as('chef'), { kind: 'set-stand-in', station: 'larder', standIn: 'pastry', label: '' });
    await applyFix(as('chef'), { kind: 'set-backup', printer: 'bar1', backup: 'pass1', label: '' });
    const now = await site();
    expect([now.stations.find((station) => station.id === 'larder')?.standIn, now.printers.find((printer) => printer.id === 'bar1')?.backup]).toEqual(['pastry', 'pass1']);
  });

  it('keeps whatever else was saved meanwhile', async () => {
    await inTransaction((transaction) => PrinterRow.update({ model: 'New' }, { where: { siteId, id: 'grill1' }, transaction }));
    await applyFix(as('installer'), { kind: 'set-printer-port', printer: 'grill1', port: 9100, label: '' });
    expect((await site()).printers.find((printer) => printer.id === 'grill1')).toMatchObject({ model: 'New', port: 9100 });
  });

  it('does not reach into another site, and says when the thing is gone', async () => {
    expect(await refused(applyFix(as('installer'), { kind: 'set-printer-port', printer: 'oven1', port: 9100, label: '' }))).toMatchObject({ code: 'not-found' });
    expect(await refused(applyFix(as('installer'), { kind: 'set-till-mask', till: 'shop-counter', mask: '255.0.0.0', label: '' }))).toMatchObject({ code: 'not-found' });
  });
});

it.each<readonly [Role, RowFix]>([
  ['chef', { kind: 'rename-printer', printer: 'grill1', name: 'X1', label: '' }],
  ['chef', { kind: 'rename-queue', till: 'till-1', printer: 'grill1', name: 'X1', label: '' }],
  ['chef', { kind: 'set-network', change: { subnet: '10.0.0.0/8' }, label: '' }],
  ['installer', { kind: 'set-stand-in', station: 'larder', standIn: 'pastry', label: '' }],
  ['trainer', { kind: 'set-backup', printer: 'bar1', backup: 'pass1', label: '' }],
])('a %s does not press what is not theirs: %j', async (role, fix) => {
  const before = await site();
  expect(await refused(applyFix(as(role), fix))).toMatchObject({ name: 'AppError', code: 'not-allowed' });
  expect(await site()).toEqual(before);
});
