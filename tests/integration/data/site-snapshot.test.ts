import { beforeAll, describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import { inTransaction } from '@/lib/server/database';
import { setLivePlan } from '@/lib/server/live-plan';
import { writePlanContent } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { insertSite } from '@/lib/server/site-store';
import { siteOf } from '@/seeders/demo-site';
import { lanternYard } from '@/seeders/lantern-yard/lantern-yard';
import { pilgrimsOven } from '@/seeders/pilgrims-oven/pilgrims-oven';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { emptyDatabase, seedDatabase, seededAt } from '@/tests/setup/demo-database';

const testedAt = new Date(seededAt.getTime() - 9 * 86_400_000).toISOString();

describe('a site read from its rows', () => {
  beforeAll(seedDatabase);

  it('is the demo that was written, with what is live on it', async () => {
    expect(await loadSite('pilgrims-oven')).toEqual(siteOf(pilgrimsOven, testedAt));
    expect(await loadSite('lantern-yard')).toEqual({
      ...siteOf(lanternYard, testedAt),
      live: { planId: 'dinner', version: 8, since: '2026-12-01T17:00:00.000Z', inForceOn: ['counter', 'terrace', 'till-1', 'till-2', 'till-3'] },
    });
  });

  it('is the same value every time', async () => {
    expect(JSON.stringify(await loadSite('lantern-yard'))).toBe(JSON.stringify(await loadSite('lantern-yard')));
  });

  it('is null when there is none', async () => {
    expect(await loadSite('nowhere')).toBeNull();
  });

  it('counts a till as in force only while it is set to the version that is live', async () => {
    await inTransaction((transaction) => setLivePlan(transaction, 'lantern-yard', { planId: asId('dinner'), version: 11, since: seededAt.toISOString(), inForceOn: [asId('till-2')] }, 'ines-okafor'));
    expect((await loadSite('lantern-yard'))?.live).toEqual({ planId: 'dinner', version: 11, since: seededAt.toISOString(), inForceOn: ['till-2'] });
  });

  it('never shows half of a change that is made meanwhile', async () => {
    const before = await loadSite('lantern-yard');
    const plan = before?.plans.find(({ name }) => name === 'Lunch');
    if (plan === undefined) throw new Error('The demo has no Lunch.');
    const oneRule = { offers: null, rules: plan.rules.slice(0, 1) };
    const write = (version: number) => inTransaction((transaction) => writePlanContent(transaction, {
      siteId: 'lantern-yard', planId: plan.id, version, content: version % 2 === 0 ? plan : oneRule, summary: 'To and fro', personId: null,
    }));
    let writing = true;
    const writer = (async () => {
      for (let version = plan.version; version < plan.version + 12; version += 1) await write(version);
      writing = false;
    })();
    const seen: (Site['plans'][number] | undefined)[] = [];
    while (writing) seen.push((await loadSite('lantern-yard'))?.plans.find(({ name }) => name === 'Lunch'));
    await writer;
    expect(seen.length).toBeGreaterThan(3);
    for (const found of seen) {
      expect([1, plan.rules.length]).toContain(found?.rules.length);
      expect(found?.rules.every(({ stations }) => stations.length > 0)).toBe(true);
      expect(found?.offers === null).toBe(found?.rules.length === 1);
    }
  });
});

/** Lists are in the order in which rows come back: by position, then by id. */
const odd: Site = aSite({
  place: 'Näs', timeZone: 'America/St_Johns', follows: 'through-link', link: { kind: 'till', till: asId('t2') },
  network: { subnet: '', gateway: '', poolFrom: '', poolTo: '', reserved: [{ address: '10.9.9.9', reason: 'The "old" fridge' }, { address: '10.9.9.10', reason: '' }] },
  contacts: [{ kind: 'electrician', name: "O'Hara; DROP TABLE", phone: '', email: '' }, { kind: 'network', name: '🧵', phone: '1', email: 'x@y.example' }],
  courses: [{ id: asId('zz'), name: 'First' }, { id: asId('aa'), name: 'Second' }],
  sharedPoints: [{ id: asId('p1'), name: 'Strip', kind: 'other' }, { id: asId('p0'), name: 'Switch', kind: 'switch' }],
  areas: [{ id: asId('a'), name: 'A', version: 1 }],
  tills: [
    aTill('t1', 'a', '', { kind: 'online', orderTypes: ['delivery'], system: 'other', addressSource: 'dhcp', mask: '' }),
    aTill('t2', 'a', '10.20.30.62', { defaultPrinter: asId('p'), sharedPoints: [asId('p0'), asId('p1')], queues: [{ printer: asId('p'), typedName: ' p\u00a0', portKind: 'shared', portAddress: '\\\\BACK\\p', testPrintedAt: '2026-02-03T04:05:06.789Z' }] }),
    aTill('t0', 'a', '10.20.30.60', { kind: 'handheld', printsThrough: asId('t2') }),
  ],
  printers: [
    aPrinter('q', '10.20.30.202', { backup: asId('p'), downSince: '2026-01-01T00:00:00.000Z', downReason: 'no paper', rollWidthMm: 76, emphasis: 'red', codePage: 'cp866', sharedPoints: [asId('p0')] }),
    aPrinter('p', '', { connection: 'serial', hostTill: asId('t2'), backup: asId('q'), joinsStations: true, presentAddress: '192.168.0.5' }),
  ],
  stations: [
    aStation('s', ['q', 'p'], { code: 'AB', standIn: asId('r'), open: false, ticketsPerSending: 3, pace: 0 }),
    aStation('r', [], { code: 'BA', kind: 'pass', position: 1, layout: 'by-seat', standIn: asId('s') }),
  ],
  menu: {
    sections: [aSection('m'), aSection('empty', { position: 1 })],
    optionGroups: [aGroup('g', ['y', 'x'], { min: 1, max: 2 }), aGroup('h', [])],
    options: [anOption('y', 'g', { allergens: ['milk', 'nuts'] }), anOption('x', 'g', { position: 1, kitchenName: 'X!' })],
    items: [
      anItem('i', 'm', { optionGroups: [asId('h'), asId('g')], allergens: ['gluten'], course: asId('aa'), preparationSeconds: 0, left: 0, soldOut: true }),
      anItem('j', 'm', { position: 1, noTicket: true, name: 'Crème "brûlée" 日本' }),
    ],
  },
  plans: [
    aPlan([
      aRule('r9', 'send', { kind: 'everything' }, ['s', 'r']), aRule('r1', 'send', { kind: 'section', section: asId('m') }, ['r'], { orderTypes: ['eat-in', 'delivery'], areas: [asId('a')] }),
      aRule('r2', 'send', { kind: 'item', item: asId('i') }, ['s'], { tills: [asId('t0'), asId('t2')] }), aRule('r3', 'split', { kind: 'option', option: asId('x') }, ['s'], {}, true),
      aRule('r4', 'split', { kind: 'option-on-section', option: asId('x'), section: asId('m') }, ['s']), aRule('r5', 'split', { kind: 'option-on-item', option: asId('y'), item: asId('i') }, ['r']),
      aRule('r0', 'copy', { kind: 'option', option: asId('y') }, ['r']),
    ], { version: 7, offers: [], weeklyTimes: [{ weekday: 1, start: '00:00' }, { weekday: 7, start: '23:59' }] }),
    aPlan([], { id: asId('other'), name: 'Other', position: 1, offers: [asId('m'), asId('empty')] }),
  ],
});

describe('any site', () => {
  beforeAll(emptyDatabase);

  it('is read as it was written, with every kind of target, condition, port and blank', async () => {
    await inTransaction((transaction) => insertSite(transaction, odd, seededAt));
    expect(await loadSite(odd.id)).toEqual(odd);
  });

  it('is written twice under two names, ids and all', async () => {
    const copy = { ...odd, id: asId<Site['id']>('copy') };
    await inTransaction((transaction) => insertSite(transaction, copy, seededAt));
    expect(await loadSite('copy')).toEqual(copy);
    expect(await loadSite(odd.id)).toEqual(odd);
  });
});
