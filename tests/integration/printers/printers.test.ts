import { beforeEach, describe, expect, it } from 'vitest';
import { createPrinter } from '@/features/printers/server/create-printer';
import { deletePrinter } from '@/features/printers/server/delete-printer';
import { markPrinter } from '@/features/printers/server/mark-printer';
import { recordTest } from '@/features/printers/server/record-test';
import { setBackup } from '@/features/printers/server/set-backup';
import { updatePrinter } from '@/features/printers/server/update-printer';
import { inputOfPrinter } from '@/features/printers/printer-form-values';
import type { PrinterInput } from '@/features/printers/schema';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { loadSite } from '@/lib/server/site-snapshot';
import { ReservedAddressRow } from '@/models/reserved-address';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const as = (role: Role): Actor => ({ person: { id: 'femi-lindqvist', name: 'Femi Lindqvist', email: '' }, membership: { role, mayOverride: false, title: '' }, siteId });
const installer = as('installer');

const site = async (): Promise<Site> => {
  const loaded = await loadSite(siteId);
  if (loaded === null) throw new Error('The demo has no Lantern Yard.');
  return loaded;
};
const printer = async (id: string): Promise<Printer> => {
  const found = (await site()).printers.find((one) => one.id === id);
  if (found === undefined) throw new Error(`The demo has no ${id}.`);
  return found;
};
const testsOf = async (id: string): Promise<number> => (await site()).tills.filter((till) => till.queues.some((queue) => queue.printer === id && queue.testPrintedAt !== null)).length;
const update = async (id: string, change: Partial<PrinterInput>, version?: number) => {
  const before = await printer(id);
  return updatePrinter(installer, { printer: id, version: version ?? before.version, input: { ...inputOfPrinter(before), ...change } });
};
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);

describe('a new printer', () => {
  it('stands last in the list with everything that was written down, and in the history', async () => {
    const input: PrinterInput = {
      ...inputOfPrinter(await printer('grill1')), name: 'GRILL2', address: '10.20.30.211', mac: '02-54-4d-1e-aa-01', serial: 'X', backup: 'grill1', rollWidthMm: 58, columns: 32, sharedPoints: [], stage: 'planned',
    };
    const { id } = await createPrinter(installer, input);
    const made = (await site()).printers.at(-1);
    expect(made).toMatchObject({ ...input, id, mac: '02:54:4D:1E:AA:01', version: 1, downSince: null });
    expect(await lastChangeOf(siteId, 'printer', id)).toMatchObject({ by: 'Femi Lindqvist', summary: 'GRILL2 added' });
  });

  it('may have a name that the checks will stop, because that is what was found on site', async () => {
    const { id } = await createPrinter(installer, { ...inputOfPrinter(await printer('grill1')), name: 'GRILL 2', address: '10.20.201' });
    expect(await printer(id)).toMatchObject({ name: 'GRILL 2', address: '10.20.201' });
  });

  it.each<readonly [string, Partial<PrinterInput>, string]>([
    ['the name of another in other letters', { name: 'grill1' }, 'name'],
    ['a till of another site', { name: 'NEW1', connection: 'usb', hostTill: 'shop-counter' }, 'hostTill'],
    ['a backup that is not there', { name: 'NEW1', backup: 'gone' }, 'backup'],
    ['a shared point that is not there', { name: 'NEW1', sharedPoints: ['gone'] }, 'sharedPoints'],
  ])('with %s is refused on its field, and nothing is written', async (_what, change, field) => {
    const before = (await site()).printers;
    const error = await refused(createPrinter(installer, { ...inputOfPrinter(await printer('grill1')), ...change }));
    expect(error).toMatchObject({ name: 'AppError', code: 'invalid', details: { fields: [{ field }] } });
    expect((await site()).printers).toEqual(before);
  });
});

describe('a changed printer', () => {
  it('is saved, with what changed in one line of history', async () => {
    expect(await update('grill1', { model: 'Counter 80', buzzer: false, sharedPoints: [] })).toEqual({ id: 'grill1', version: 2 });
    expect(await printer('grill1')).toMatchObject({ model: 'Counter 80', buzzer: false, sharedPoints: [], version: 2 });
    expect((await lastChangeOf(siteId, 'printer', 'grill1'))?.summary).toMatch(/^GRILL1: model .* to Counter 80, buzzer yes to no/);
  });

  it('is refused when somebody saved it since, and keeps what they saved', async () => {
    await update('grill1', { model: 'Theirs' });
    expect(await refused(update('grill1', { model: 'Mine' }, 1))).toMatchObject({ name: 'StaleWrite', version: 2, current: { model: 'Theirs' } });
    expect(await printer('grill1')).toMatchObject({ model: 'Theirs', version: 2 });
  });

  it('keeps its tests and its stage while the device and its way stay the same', async () => {
    const before = await testsOf('grill1');
    await update('grill1', { name: 'GRILL9', backup: null });
    expect([await testsOf('grill1'), (await printer('grill1')).stage]).toEqual([before, 'signed-off']);
  });

  it.each<readonly [string, Partial<PrinterInput>]>([
    ['another address', { address: '10.20.30.220' }], ['another port', { port: 9101 }], ['another serial number: it was replaced', { serial: 'REPLACED' }],
  ])('with %s has to be tested again', async (_what, change) => {
    expect(await testsOf('grill1')).toBeGreaterThan(0);
    await update('grill1', change);
    expect([await testsOf('grill1'), (await printer('grill1')).stage]).toEqual([0, 'addressed']);
  });

  it('takes the reservation of its address along when it is renamed', async () => {
    await ReservedAddressRow.create({ siteId, address: '10.20.30.120', reason: 'LARDER 1, cold line', position: 9 });
    await update((await site()).printers.find((one) => one.name === 'LARDER 1')!.id, { name: 'LARDER1' });
    expect((await site()).network.reserved).toContainEqual({ address: '10.20.30.120', reason: 'LARDER1, cold line' });
  });

  it('on the network hangs on no till, whatever the form had chosen before', async () => {
    await update('bar2', { connection: 'network', address: '10.20.30.212' });
    expect(await printer('bar2')).toMatchObject({ connection: 'network', hostTill: null });
  });
});

describe('a printer that is down', () => {
  it('says since when and why, and is up again at one press', async () => {
    await markPrinter(as('chef'), { printer: 'grill1', down: true, reason: 'Paper jam' }, new Date('2026-12-01T19:50:00.000Z'));
    await markPrinter(as('chef'), { printer: 'grill1', down: true, reason: 'Still jammed' }, new Date('2026-12-01T19:55:00.000Z'));
    expect(await printer('grill1')).toMatchObject({ downSince: '2026-12-01T19:50:00.000Z', downReason: 'Still jammed' });
    await markPrinter(as('chef'), { printer: 'grill1', down: false, reason: '' });
    expect(await printer('grill1')).toMatchObject({ downSince: null, downReason: '' });
    expect(await lastChangeOf(siteId, 'printer', 'grill1')).toMatchObject({ summary: 'GRILL1 is up again' });
  });
});

describe('a printed test', () => {
  it('is noted for one till, and can be taken back', async () => {
    await recordTest(as('chef'), { printer: 'pastry1', till: 'till-2', printed: true }, new Date('2026-12-01T20:00:00.000Z'));
    expect((await site()).tills.find((till) => till.id === 'till-2')?.queues.find((queue) => queue.printer === 'pastry1')?.testPrintedAt).toBe('2026-12-01T20:00:00.000Z');
    await recordTest(as('chef'), { printer: 'pastry1', till: 'till-2', printed: false });
    expect(await testsOf('pastry1')).toBe(0);
  });
  it('cannot have come from a till that does not have the printer', async () => {
    expect(await refused(recordTest(installer, { printer: 'bar2', till: 'till-1', printed: true }))).toMatchObject({ code: 'conflict' });
  });
});

describe('a printer taken off the list', () => {
  it('leaves every list that named it, and the history says what that costs', async () => {
    await deletePrinter(installer, { printer: 'sauce1', version: (await printer('sauce1')).version });
    const after = await site();
    expect(after.printers.map((one) => one.id)).not.toContain('sauce1');
    expect(after.printers.filter((one) => one.backup === 'sauce1')).toEqual([]);
    expect(after.stations.find((station) => station.name === 'Sauce')?.printers).toEqual([]);
    expect(after.tills.flatMap((till) => till.queues).filter((queue) => queue.printer === 'sauce1')).toEqual([]);
    expect((await lastChangeOf(siteId, 'printer', 'sauce1'))?.summary).toContain('Sauce has no other printer');
  });
  it('stays, with all its lists, when somebody changed it since', async () => {
    const before = await site();
    expect(await refused(deletePrinter(installer, { printer: 'sauce1', version: 99 }))).toMatchObject({ name: 'StaleWrite' });
    expect(await site()).toEqual(before);
  });
});

it('a backup is a chef’s to set, and never the printer itself', async () => {
  await setBackup(as('chef'), { printer: 'bar1', backup: 'pass1' });
  expect((await printer('bar1')).backup).toBe('pass1');
  expect(await refused(setBackup(as('chef'), { printer: 'bar1', backup: 'bar1' }))).toMatchObject({ code: 'invalid' });
});

it.each<readonly [string, Role, (actor: Actor) => Promise<unknown>]>([
  ['a chef does not add printers', 'chef', async (actor) => createPrinter(actor, { ...inputOfPrinter(await printer('grill1')), name: 'X1' })],
  ['a chef does not change printers', 'chef', async (actor) => updatePrinter(actor, { printer: 'grill1', version: 1, input: inputOfPrinter(await printer('grill1')) })],
  ['a trainer does not take printers off', 'trainer', (actor) => deletePrinter(actor, { printer: 'grill1', version: 1 })],
  ['a trainer does not mark printers down', 'trainer', (actor) => markPrinter(actor, { printer: 'grill1', down: true, reason: '' })],
  ['a trainer does not note tests', 'trainer', (actor) => recordTest(actor, { printer: 'grill1', till: 'till-1', printed: true })],
  ['a trainer does not set backups', 'trainer', (actor) => setBackup(actor, { printer: 'grill1', backup: null })],
])('%s', async (_what, role, attempt) => {
  const before = await site();
  expect(await refused(attempt(as(role)))).toMatchObject({ name: 'AppError', code: 'not-allowed' });
  expect(await site()).toEqual(before);
});
