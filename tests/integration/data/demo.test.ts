import { verify } from '@node-rs/argon2';
import { beforeAll, describe, expect, it } from 'vitest';
import { checkSite } from '@/lib/domain/checks/check-site';
import { differences } from '@/lib/domain/plans/differences';
import { summarise } from '@/lib/domain/proof/summarise';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { readPlanVersion } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { MembershipRow } from '@/models/membership';
import { PersonRow } from '@/models/person';
import { demoPassword, seedDatabase } from '@/tests/setup/demo-database';

let site: Site;
let dinner: Plan;
let proof: ProofSummary;

const mustLoad = async (id: string): Promise<Site> => {
  const loaded = await loadSite(id);
  if (loaded === null) throw new Error(`The demo has no ${id}.`);
  return loaded;
};

const planOf = (of: Site, name: string): Plan => {
  const plan = of.plans.find((one) => one.name === name);
  if (plan === undefined) throw new Error(`${of.name} has no ${name}.`);
  return plan;
};

const prove = (of: Site, plan: Plan): ProofSummary => summarise(of, plan, checkSite(of, plan));

beforeAll(async () => {
  await seedDatabase();
  site = await mustLoad('lantern-yard');
  dinner = planOf(site, 'Dinner');
  proof = prove(site, dinner);
});

describe('Lantern Yard, Portmere', () => {
  it('has 182 items in its sections', () => {
    const counted = site.menu.sections.map(({ id, name }) => [name, site.menu.items.filter((item) => item.section === id).length]);
    expect(counted).toEqual([
      ['From the grill', 18], ['Burgers', 9], ['Sunday roast', 7], ['Salads', 11], ['Cold starters', 12], ['Pasta', 13], ['Fish', 10], ['Sides', 15], ['Desserts', 16],
      ['Cocktails', 22], ['Wine and beer', 31], ['Hot drinks', 8], ['Late menu', 6], ['Oysters', 4],
    ]);
    expect(site.menu.items).toHaveLength(182);
  });

  it('is tried in 3,705 ways: 182 items and 65 options, from 5 tills, in 3 order types', () => {
    expect(proof).toMatchObject({ items: 182, options: 65, tills: 5, orderTypes: 3, ways: 3705 });
    expect(site.tills.every((till) => till.orderTypes.length === orderTypes.length)).toBe(true);
  });

  it('has six stations, whose codes differ from each other in both letters', () => {
    expect(site.stations.map(({ name, code, kind, mesh, colour }) => [name, code, kind, mesh, colour])).toEqual([
      ['Grill', 'GR', 'prep', 'square', 'brick'], ['Larder', 'LD', 'prep', 'diagonal', 'slate'], ['Sauce', 'SC', 'prep', 'dots', 'aubergine'],
      ['Pastry', 'PY', 'prep', 'bars', 'mustard'], ['Bar', 'BA', 'prep', 'diamond', 'pine'], ['Pass', 'EX', 'pass', 'lines', 'iron'],
    ]);
    for (const place of [0, 1]) expect(new Set(site.stations.map(({ code }) => code[place])).size).toBe(6);
  });

  it('sends to each station as many items as its rail says', () => {
    const itemsAt = (name: string) => {
      const station = site.stations.find((one) => one.name === name)?.id;
      const sections = dinner.rules.flatMap(({ kind, target, stations }) => (kind === 'send' && target.kind === 'section' && stations.some((id) => id === station) ? [target.section] : []));
      return site.menu.items.filter((item) => sections.includes(item.section)).length;
    };
    expect(['Grill', 'Larder', 'Sauce', 'Pastry', 'Bar'].map(itemsAt)).toEqual([34, 23, 38, 16, 61]);
  });

  it('has seven printers with their addresses, backups and stages', () => {
    const nameOf = (id: string | null) => site.printers.find((printer) => printer.id === id)?.name ?? null;
    expect(site.printers.map(({ name, address, backup, stage }) => [name, address, nameOf(backup), stage])).toEqual([
      ['GRILL1', '10.20.30.201', 'SAUCE1', 'signed-off'], ['LARDER 1', '10.20.30.202', null, 'reachable'], ['SAUCE1', '10.20.30.203', 'GRILL1', 'tested'],
      ['PASTRY1', '10.20.30.204', 'PASS1', 'addressed'], ['BAR1', '10.20.30.205', null, 'signed-off'], ['BAR2', '', null, 'signed-off'], ['PASS1', '10.20.30.210', 'SAUCE1', 'reachable'],
    ]);
    expect(site.printers.filter(({ stage }) => stage === 'signed-off')).toHaveLength(3);
    const standIns = site.stations.map(({ name, standIn }) => [name, site.stations.find(({ id }) => id === standIn)?.name ?? null]);
    expect(standIns).toEqual([['Grill', 'Sauce'], ['Larder', null], ['Sauce', 'Grill'], ['Pastry', 'Larder'], ['Bar', null], ['Pass', null]]);
  });

  it('has five tills at .61 to .65, on which 24 of 31 printers have printed a test', () => {
    const areaOf = (id: string) => site.areas.find((area) => area.id === id)?.name;
    expect(site.tills.map(({ name, area, address }) => [name, areaOf(area), address])).toEqual([
      ['Till 1', 'Main room', '10.20.30.61'], ['Till 2', 'Main room', '10.20.30.62'], ['Till 3', 'Main room', '10.20.30.63'], ['Terrace', 'Terrace', '10.20.30.64'], ['Counter', 'Bar counter', '10.20.30.65'],
    ]);
    const queues = site.tills.flatMap((till) => till.queues);
    expect(queues).toHaveLength(31);
    expect(queues.filter(({ testPrintedAt }) => testPrintedAt !== null)).toHaveLength(24);
  });

  it('has these mistakes to find in Dinner, and no others', () => {
    expect(proof).toMatchObject({ lostItems: 10, partLostItems: 0 });
    expect(proof.findings.filter(({ severity }) => severity !== 'note').map(({ severity, title }) => [severity, title])).toEqual([
      ['stop', 'Late menu and Oysters have no station'], ['stop', 'LARDER 1 has a space in its name'], ['stop', 'On Till 3, PASS1 goes to a parallel port'],
      ['check', 'PASTRY1 has never printed a test'],
    ]);
  });

  it('loses 61 items on 4 tills with BAR1, 23 on 5 with LARDER 1, and none with any other printer', () => {
    expect(proof.drill.filter(({ itemsLost }) => itemsLost > 0).map(({ name, itemsLost, tillsAffected }) => [name, itemsLost, tillsAffected])).toEqual([['BAR1', 61, 4], ['LARDER 1', 23, 5]]);
    expect(proof.drill).toHaveLength(7);
  });

  it('is live at a Dinner of three changes ago, in force on all five tills, which loses nothing', async () => {
    expect(site.live).toMatchObject({ planId: dinner.id, version: dinner.version - 3 });
    expect(site.live?.inForceOn).toHaveLength(5);
    const content = await readPlanVersion(site.id, dinner.id, dinner.version - 3);
    if (content === null) throw new Error('The live version is not kept.');
    expect(differences(content, dinner, site)).toHaveLength(3);
    expect(prove(site, { ...dinner, ...content })).toMatchObject({ lostItems: 0, partLostItems: 0, items: 172 });
  });

  it('has four plans through the day, of which only Dinner loses anything', () => {
    expect(site.plans.map(({ name, weeklyTimes }) => [name, weeklyTimes.length, ...new Set(weeklyTimes.map(({ start }) => start))])).toEqual([
      ['Breakfast', 7, '07:00'], ['Lunch', 7, '11:30'], ['Dinner', 7, '17:00'], ['Quiet night', 7, '22:00'],
    ]);
    expect(site.plans.map((plan) => prove(site, plan).lostItems)).toEqual([0, 0, 10, 0]);
  });
});

describe("Pilgrim's Oven, Haverlow", () => {
  it('is small, not live, and has its mistakes in its addresses', async () => {
    const bakery = await mustLoad('pilgrims-oven');
    expect([bakery.menu.items, bakery.stations, bakery.printers, bakery.tills, bakery.plans].map(({ length }) => length)).toEqual([24, 3, 2, 2, 2]);
    expect(bakery.live).toBeNull();
    expect(checkSite(bakery).map(({ code }) => code)).toEqual(['address-range', 'mask-differs', 'address-in-pool', 'never-tested', 'never-tested']);
  });
});

describe('the people of the demo', () => {
  it('are one for each role on both sites, with their titles', async () => {
    const rows = await MembershipRow.findAll({ order: ['siteId', 'role'] });
    expect(rows.map(({ siteId, personId, role, title, mayOverride }) => [siteId, role, personId, title, mayOverride])).toEqual([
      ['lantern-yard', 'chef', 'ines-okafor', 'head chef', true], ['lantern-yard', 'installer', 'femi-lindqvist', 'installer', false],
      ['lantern-yard', 'owner', 'marguerite-adeyemi', 'owner', false], ['lantern-yard', 'trainer', 'tomas-brandt', 'trainer', false],
      ['pilgrims-oven', 'chef', 'bram-okonjo', 'head baker', false], ['pilgrims-oven', 'installer', 'femi-lindqvist', 'installer', false],
      ['pilgrims-oven', 'owner', 'halima-pettersen', 'owner', false], ['pilgrims-oven', 'trainer', 'tomas-brandt', 'trainer', false],
    ]);
  });

  it('sign in with the password that was given, and it stands nowhere in the database', async () => {
    const people = await PersonRow.findAll();
    expect(people).toHaveLength(6);
    expect(new Set(people.map(({ passwordHash }) => passwordHash)).size).toBe(6);
    for (const { passwordHash } of people) {
      expect(passwordHash).toMatch(/^\$argon2id\$/);
      expect(await verify(passwordHash, demoPassword)).toBe(true);
    }
  });
});
