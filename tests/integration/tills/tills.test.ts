import { beforeEach, describe, expect, it } from 'vitest';
import { createTill } from '@/features/tills/server/create-till';
import { deleteTill } from '@/features/tills/server/delete-till';
import { updateTill } from '@/features/tills/server/update-till';
import { createArea, deleteArea, renameArea } from '@/features/tills/server/write-area';
import { removeQueue, writeQueue } from '@/features/tills/server/write-queue';
import { inputOfTill } from '@/features/tills/till-of-input';
import type { TillInput } from '@/features/tills/schema';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Site } from '@/lib/domain/site/site';
import type { Till } from '@/lib/domain/site/till';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { loadSite } from '@/lib/server/site-snapshot';
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
const till = async (id: string): Promise<Till> => {
  const found = (await site()).tills.find((one) => one.id === id);
  if (found === undefined) throw new Error(`The demo has no ${id}.`);
  return found;
};
const update = async (id: string, change: Partial<TillInput>, version?: number) => {
  const before = await till(id);
  return updateTill(installer, { till: id, version: version ?? before.version, input: { ...inputOfTill(before), ...change } });
};
const queueOn = async (id: string, printer: string) => (await till(id)).queues.find((queue) => queue.printer === printer);
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);

describe('a till', () => {
  it('is written down with its queues, last in the list', async () => {
    const input: TillInput = { ...inputOfTill(await till('till-1')), name: 'Till 9', address: '10.20.30.66', orderTypes: ['delivery'], sharedPoints: [], queues: [{ printer: 'grill1', typedName: ' GRILL1', portKind: 'tcp', portAddress: '10.20.30.201:9100', testPrintedAt: null }] };
    const { id } = await createTill(installer, input);
    expect((await site()).tills.at(-1)).toEqual({ ...input, id, version: 1 });
    expect(await lastChangeOf(siteId, 'till', id)).toMatchObject({ summary: 'Till 9 added' });
  });

  it('is changed with all its lists, in one line of history', async () => {
    await update('till-1', { address: '10.20.30.71', orderTypes: ['eat-in'], sharedPoints: [], queues: [] });
    expect(await till('till-1')).toMatchObject({ address: '10.20.30.71', orderTypes: ['eat-in'], sharedPoints: [], queues: [], version: 2 });
    expect((await lastChangeOf(siteId, 'till', 'till-1'))?.summary).toMatch(/^Till 1: sends orders .*, address 10\.20\.30\.61 to 10\.20\.30\.71, .*GRILL1 taken off/);
  });

  it('is refused when somebody saved it since, and keeps what they saved', async () => {
    await update('till-1', { adapter: 'Theirs' });
    expect(await refused(update('till-1', { adapter: 'Mine', queues: [] }, 1))).toMatchObject({ name: 'StaleWrite', version: 2 });
    expect(await till('till-1')).toMatchObject({ adapter: 'Theirs' });
    expect((await till('till-1')).queues.length).toBeGreaterThan(0);
  });

  it.each<readonly [string, Partial<TillInput>, string]>([
    ['the name of another', { name: 'TILL 2' }, 'name'], ['an area of another site', { area: 'shop' }, 'area'], ['itself to print through', { printsThrough: 'till-1' }, 'printsThrough'],
    ['a printer that is not there', { queues: [{ printer: 'oven1', typedName: 'OVEN1', portKind: 'tcp', portAddress: '', testPrintedAt: null }] }, 'queues'],
    ['a default printer that is not there', { defaultPrinter: 'oven1' }, 'defaultPrinter'],
  ])('with %s is refused on its field', async (_what, change, field) => {
    expect(await refused(update('till-1', change))).toMatchObject({ code: 'invalid', details: { fields: [{ field }] } });
    expect(await till('till-1')).toMatchObject({ version: 1 });
  });

  it('goes with its queues while nothing needs it', async () => {
    await deleteTill(installer, { till: 'till-2', version: 1 });
    expect((await site()).tills.map((one) => one.id)).not.toContain('till-2');
  });

  it('stays while a printer is plugged into it', async () => {
    expect(await refused(deleteTill(installer, { till: 'terrace', version: 1 }))).toMatchObject({ code: 'conflict', message: expect.stringContaining('BAR2 is plugged into it') as string });
    expect(await till('terrace')).toMatchObject({ version: 1 });
  });
});

describe('a queue', () => {
  it('is written down as it was found, and the till’s version moves on', async () => {
    await writeQueue(installer, { till: 'till-2', printer: 'grill1', input: { typedName: 'GRILL 1', portKind: 'shared', portAddress: '\\\\COUNTER\\GRILL1', testPrintedAt: null } });
    expect(await queueOn('till-2', 'grill1')).toMatchObject({ typedName: 'GRILL 1', portKind: 'shared', portAddress: '\\\\COUNTER\\GRILL1' });
    expect((await till('till-2')).version).toBe(2);
  });

  it('loses its test with its port, and keeps it with its name', async () => {
    const before = await queueOn('till-2', 'grill1');
    expect(before?.testPrintedAt).not.toBeNull();
    const { printer: _printer, ...input } = before!;
    await writeQueue(installer, { till: 'till-2', printer: 'grill1', input: { ...input, typedName: 'GRILL-1' } });
    expect(await queueOn('till-2', 'grill1')).toMatchObject({ typedName: 'GRILL-1', testPrintedAt: before?.testPrintedAt });
    await writeQueue(installer, { till: 'till-2', printer: 'grill1', input: { ...input, portAddress: '10.20.30.209:9100' } });
    expect(await queueOn('till-2', 'grill1')).toMatchObject({ portAddress: '10.20.30.209:9100', testPrintedAt: null });
  });

  it('is forgotten when it is no longer installed', async () => {
    await removeQueue(installer, { till: 'till-2', printer: 'grill1' });
    expect(await queueOn('till-2', 'grill1')).toBeUndefined();
    expect(await lastChangeOf(siteId, 'till', 'till-2')).toMatchObject({ summary: 'Till 2: GRILL1 taken off' });
  });
});

describe('an area', () => {
  it('is added last, renamed against its version, and taken off again', async () => {
    const { id } = await createArea(installer, { name: 'Yard' });
    expect((await site()).areas.at(-1)).toMatchObject({ id, name: 'Yard' });
    expect(await renameArea(installer, { area: id, version: 1, input: { name: 'Courtyard' } })).toEqual({ id, version: 2 });
    expect(await refused(renameArea(installer, { area: id, version: 1, input: { name: 'Garden' } }))).toMatchObject({ name: 'StaleWrite' });
    await deleteArea(installer, { area: id, version: 2 });
    expect((await site()).areas.map((area) => area.name)).toEqual(['Main room', 'Terrace', 'Bar counter']);
  });
  it('has a name of its own', async () => {
    expect(await refused(createArea(installer, { name: 'terrace' }))).toMatchObject({ code: 'invalid', details: { fields: [{ field: 'name' }] } });
  });
  it('stays while tills stand in it', async () => {
    expect(await refused(deleteArea(installer, { area: 'bar-counter', version: 1 }))).toMatchObject({ code: 'conflict', message: expect.stringContaining('Counter stands in it') as string });
  });
});

it.each<readonly [string, (actor: Actor) => Promise<unknown>]>([
  ['add tills', async (actor) => createTill(actor, { ...inputOfTill(await till('till-1')), name: 'X' })],
  ['change tills', async (actor) => updateTill(actor, { till: 'till-1', version: 1, input: inputOfTill(await till('till-1')) })],
  ['take tills off', (actor) => deleteTill(actor, { till: 'till-2', version: 1 })],
  ['write queues', (actor) => writeQueue(actor, { till: 'till-2', printer: 'grill1', input: { typedName: 'X', portKind: 'tcp', portAddress: '', testPrintedAt: null } })],
  ['forget queues', (actor) => removeQueue(actor, { till: 'till-2', printer: 'grill1' })],
  ['add areas', (actor) => createArea(actor, { name: 'Yard' })],
  ['rename areas', (actor) => renameArea(actor, { area: 'terrace', version: 1, input: { name: 'Yard' } })],
  ['take areas off', (actor) => deleteArea(actor, { area: 'terrace', version: 1 })],
])('a chef does not %s', async (_what, attempt) => {
  const before = await site();
  expect(await refused(attempt(as('chef')))).toMatchObject({ name: 'AppError', code: 'not-allowed' });
  expect(await site()).toEqual(before);
});
