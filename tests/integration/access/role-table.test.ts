import { describe, expect, it } from 'vitest';
import { may, permissions, roles, type Permission } from '@/lib/domain/roles/permissions';

type Row = readonly [what: string, rights: readonly Permission[], who: Readonly<Record<(typeof roles)[number], boolean>>];

const row = (what: string, rights: readonly Permission[], owner: boolean, chef: boolean, installer: boolean, trainer: boolean): Row => [what, rights, { owner, chef, installer, trainer }];

/** What each role may do on a site, as restaurants divide it. */
const table: readonly Row[] = [
  row('see the board, the proof and tickets, and try an order', ['site.read', 'order.try'], true, true, true, true),
  row('write the menu, stations, rules, plans and weekly times', ['menu.write', 'station.write', 'plan.write'], true, true, false, false),
  row('put live, close a station, divert', ['plan.go-live', 'station.close'], true, true, false, false),
  row('override a stop', ['stop.override'], true, false, false, false),
  row('write printers, tills and the network', ['printer.write', 'till.write', 'network.write'], true, false, true, false),
  row('print a test, mark a printer down, set a backup', ['printer.test', 'printer.mark-down', 'printer.set-backup'], true, true, true, false),
  row('copy a site’s set-up', ['site.copy'], true, false, true, false),
  row('write scenarios and walkthroughs', ['scenario.write'], true, true, false, true),
  row('say who may what, and settle the site', ['people.write', 'site.settings'], true, false, false, false),
  row('read the history', ['history.read'], true, true, true, true),
  row('write the handover pack', ['handover.write'], true, false, true, false),
];

describe('the role table', () => {
  it.each(table)('says who may %s', (_what, rights, who) => {
    for (const right of rights) for (const role of roles) expect([right, role, may({ role, mayOverride: false }, right)]).toEqual([right, role, who[role]]);
  });

  it('has a line for every right there is', () => {
    expect(table.flatMap(([, rights]) => rights).toSorted()).toEqual(Object.keys(permissions).toSorted());
  });

  it('lets a chef override a stop when the owner allows this person, and nobody else', () => {
    expect(roles.filter((role) => may({ role, mayOverride: true }, 'stop.override'))).toEqual(['owner', 'chef']);
  });
});
