import { beforeEach, describe, expect, it } from 'vitest';
import { inputOfStation, newStationInput } from '@/features/stations/station-view';
import type { StationInput } from '@/features/stations/schema';
import { createStation, deleteStation, orderStations, updateStation } from '@/features/stations/server/stations';
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
    await updateStation(chef, bar.id, bar.version, { ...inputOfStation(bar), open: false, printers: ['bar1', 'bar2'] });
    expect(await station('Bar')).toMatchObject({ open: false, printers: ['bar1', 'bar2'] });
    expect(await lastChangeOf(siteId, 'station', bar.id)).toMatchObject({ summary: 'Bar closed' });
    expect(await refused(updateStation(chef, bar.id, bar.version, inputOfStation(bar)))).toBeInstanceOf(StaleWrite);
  });

  it('stay while a rule sends to them, and are let go of as stand-ins when they go', async () => {
    const grill = await station('Grill');
    expect(await refused(deleteStation(chef, grill.id, grill.version))).toMatchObject({ code: 'conflict' });
    const { id } = await createStation(chef, await fry());
    const pass = await station('Larder');
    await updateStation(chef, pass.id, pass.version, { ...inputOfStation(pass), standIn: id });
    await deleteStation(chef, id, 1);
    expect(await station('Larder')).toMatchObject({ standIn: null });
  });

  it('are put in another order', async () => {
    const ids = (await site()).stations.map((one) => one.id as string).toReversed();
    await orderStations(chef, ids);
    expect((await site()).stations.map((one) => one.id)).toEqual(ids);
  });

  it('are not for installers and trainers to change', async () => {
    for (const role of ['installer', 'trainer'] as const) expect(await refused(createStation(as(role), await fry()))).toMatchObject({ code: 'not-allowed' });
  });
});
