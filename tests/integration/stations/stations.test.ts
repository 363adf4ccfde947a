import { beforeEach, describe, expect, it } from 'vitest';
import type { StationInput } from '@/features/stations/schema';
import { createStation } from '@/features/stations/server/create-station';
import { deleteStation } from '@/features/stations/server/delete-station';
import { orderStations } from '@/features/stations/server/order-stations';
import { updateStation } from '@/features/stations/server/update-station';
import { inputOfStation, newStationInput } from '@/features/stations/station-form-values';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Site } from '@/lib/domain/site/site';
import type { Station } from '@/lib/domain/site/station';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { loadSite } from '@/lib/server/site-snapshot';
import { StaleWrite } from '@/lib/server/versioned-update';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const as = (role: Role): Actor => ({ person: { id: 'ines-okafor', name: 'Ines Okafor', email: '' }, membership: { role, mayOverride: false, title: '' }, siteId });
const chef = as('chef');
const site = async (): Promise<Site> => (await loadSite(siteId))!;
const station = async (name: string): Promise<Station> => (await site()).stations.find((one) => one.name === name)!;
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);
const fry = async (more: Partial<StationInput> = {}): Promise<StationInput> => ({ ...newStationInput((await site()).stations), name: 'Fry', code: 'FW', printers: ['grill1'], ...more });

describe('stations', () => {
  it('are added last with all that was written down', async () => {
    const { id } = await createStation(chef, await fry({ standIn: 'grill', pace: 9, ticketsPerSending: 2 }));
    expect((await site()).stations.at(-1)).toMatchObject({ id, name: 'Fry', code: 'FW', printers: ['grill1'], standIn: 'grill', pace: 9, ticketsPerSending: 2, version: 1 });
  });

  it.each<readonly [string, Partial<StationInput>, string]>([
    ['a name that is taken', { name: 'grill' }, 'name'],
    ['a code with the first letter of another', { code: 'GZ' }, 'code'],
    ['a code with the second letter of another', { code: 'ZR' }, 'code'],
    ['a printer of another site', { printers: ['oven1'] }, 'printers'],
    ['a stand-in that does not exist', { standIn: 'nowhere' }, 'standIn'],
  ])('refuse %s on its field', async (_, change, field) => {
    expect(await refused(createStation(chef, await fry(change)))).toMatchObject({ code: 'invalid', details: { fields: [{ field }] } });
  });

  it('close and open with a word in the history, and keep their printers in order', async () => {
    const bar = await station('Bar');
    await updateStation(chef, { station: bar.id, version: bar.version, input: { ...inputOfStation(bar), open: false, printers: ['bar1', 'bar2'] } });
    expect(await station('Bar')).toMatchObject({ open: false, printers: ['bar1', 'bar2'], version: bar.version + 1 });
    expect(await lastChangeOf(siteId, 'station', bar.id)).toMatchObject({ by: 'Ines Okafor', summary: 'Bar closed; printers BAR2, then BAR1 to BAR1, then BAR2' });
  });

  it('keep what somebody else saved first, whole, and hand it back with the refusal', async () => {
    const bar = await station('Bar');
    await updateStation(chef, { station: bar.id, version: bar.version, input: { ...inputOfStation(bar), printers: ['bar1'], pace: 35 } });
    const error = await refused(updateStation(chef, { station: bar.id, version: bar.version, input: { ...inputOfStation(bar), name: 'Cocktails', code: 'GZ' } }));
    expect(error).toBeInstanceOf(StaleWrite);
    expect(error).toMatchObject({ version: bar.version + 1, current: { pace: 35 } });
    expect(await station('Bar')).toMatchObject({ name: 'Bar', printers: ['bar1'], pace: 35 });
  });

  it('that are gone are said to be gone', async () => {
    expect(await refused(updateStation(chef, { station: 'nowhere', version: 1, input: await fry() }))).toMatchObject({ code: 'not-found' });
    expect(await refused(deleteStation(chef, { station: 'nowhere', version: 1 }))).not.toBe('done');
  });

  it('stay while a plan sends to them', async () => {
    const grill = await station('Grill');
    const error = await refused(deleteStation(chef, { station: grill.id, version: grill.version }));
    expect(error).toMatchObject({ code: 'conflict' });
    expect(String((error as Error).message)).toMatch(/send dishes or copies to it/);
    expect(await station('Grill')).toEqual(grill);
  });

  it('are let go of as stand-ins when they go, which the history says', async () => {
    const { id } = await createStation(chef, await fry());
    const larder = await station('Larder');
    await updateStation(chef, { station: larder.id, version: larder.version, input: { ...inputOfStation(larder), standIn: id } });
    expect(await refused(deleteStation(chef, { station: id, version: 9 }))).toBeInstanceOf(StaleWrite);
    expect(await station('Larder')).toMatchObject({ standIn: id });
    await deleteStation(chef, { station: id, version: 1 });
    expect(await station('Larder')).toMatchObject({ standIn: null, version: larder.version + 2 });
    expect((await lastChangeOf(siteId, 'station', id))?.summary).toBe('Fry taken off the list. Larder has no stand-in any more.');
  });

  it('are put in another order all together, or not at all', async () => {
    const ids = (await site()).stations.map((one) => one.id as string).toReversed();
    await orderStations(chef, ids);
    expect((await site()).stations.map((one) => one.id)).toEqual(ids);
    for (const wrong of [ids.slice(1), [...ids, 'oven'], [...ids.slice(1), ids[1]!]]) expect(await refused(orderStations(chef, wrong))).toMatchObject({ code: 'conflict' });
    expect((await site()).stations.map((one) => one.id)).toEqual(ids);
  });

  it.each<readonly [string, (actor: Actor) => Promise<unknown>]>([
    ['added', async (actor) => createStation(actor, await fry())],
    ['changed', async (actor) => updateStation(actor, { station: 'grill', version: 1, input: inputOfStation(await station('Grill')) })],
    ['taken off', (actor) => deleteStation(actor, { station: 'grill', version: 1 })],
    ['put in order', (actor) => orderStations(actor, ['grill'])],
  ])('are not %s by installers and trainers', async (_, attempt) => {
    const before = await site();
    for (const role of ['installer', 'trainer'] as const) expect(await refused(attempt(as(role)))).toMatchObject({ code: 'not-allowed' });
    expect(await site()).toEqual(before);
  });
});
