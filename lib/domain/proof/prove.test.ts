import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import type { Plan } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { allWell } from '@/lib/domain/site/present';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { provePlan } from './prove';

/** Two tills, a grill and a larder, a pass; small enough to work out on paper. */
const kitchen = (more: Partial<Site> = {}): Site => aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }, { id: asId('terrace'), name: 'Terrace', version: 1 }],
  tills: [aTill('till1', 'room', '10.20.30.61', { name: 'Till 1', orderTypes: ['eat-in'] }), aTill('till2', 'terrace', '10.20.30.62', { name: 'Till 2', orderTypes: ['eat-in', 'take-away'] })],
  printers: [aPrinter('GRILL1', '10.20.30.201'), aPrinter('LARDER1', '10.20.30.202'), aPrinter('PASS1', '10.20.30.210')],
  stations: [
    aStation('grill', ['GRILL1'], { name: 'Grill', position: 0 }),
    aStation('larder', ['LARDER1'], { name: 'Larder', position: 1 }),
    aStation('pass', ['PASS1'], { name: 'Pass', kind: 'pass', position: 2 }),
  ],
  menu: {
    sections: [aSection('burgers', { name: 'Burgers' }), aSection('salads', { name: 'Salads' })],
    items: [anItem('burger', 'burgers', { name: 'House burger', optionGroups: [asId('sides')] }), anItem('tomato', 'salads', { name: 'Tomato salad' })],
    optionGroups: [aGroup('sides', ['chips', 'side'])],
    options: [anOption('chips', 'sides', { name: 'chips' }), anOption('side', 'sides', { name: 'side salad' })],
  },
  ...more,
});

const toGrill = aRule('r1', 'send', { kind: 'section', section: asId('burgers') }, ['grill']);
const toLarder = aRule('r2', 'send', { kind: 'section', section: asId('salads') }, ['larder']);
const sideToLarder = aRule('r3', 'split', { kind: 'option', option: asId('side') }, ['larder']);
const allToPass = aRule('r4', 'copy', { kind: 'everything' }, ['pass']);
const whole = [toGrill, toLarder, sideToLarder, allToPass];

const found = (site: Site, plan: Plan): readonly string[] => provePlan(site, plan).findings.map((finding) => `${finding.severity} ${finding.code}`);

/** Worked out on paper: what is changed, and every finding that must then be there, no more and no fewer. */
const cases: readonly { readonly name: string; readonly site?: Partial<Site>; readonly plan: Plan; readonly findings: readonly string[] }[] = [
  { name: 'a whole plan has nothing to say', plan: aPlan(whole), findings: [] },
  { name: 'a section without a rule is lost, and nothing reaches its station', plan: aPlan([toGrill, allToPass]), findings: ['stop section-without-station', 'check station-idle'] },
  {
    name: 'a rule that holds only on the terrace loses the item elsewhere',
    plan: aPlan([toGrill, { ...toLarder, conditions: { orderTypes: [], areas: [asId('terrace')], tills: [] } }, sideToLarder, allToPass]),
    findings: ['stop section-without-station'],
  },
  {
    name: 'a station without a printer loses its dishes and leaves the other part of a split without the allergy',
    site: { stations: [aStation('grill', ['GRILL1'], { name: 'Grill' }), aStation('larder', [], { name: 'Larder' }), aStation('pass', ['PASS1'], { name: 'Pass', kind: 'pass' })] },
    plan: aPlan(whole), findings: ['stop station-without-printer', 'stop allergy-does-not-reach', 'check printer-idle'],
  },
  { name: 'two rules as narrow as each other, to different stations', plan: aPlan([...whole, { ...toGrill, id: asId('r5'), stations: [asId('larder')] }]), findings: ['check tie', 'check rule-shadowed', 'check station-idle'] },
  { name: 'two rules as narrow as each other, to the same station', plan: aPlan([...whole, { ...toGrill, id: asId('r5') }]), findings: ['check rule-shadowed', 'note tie-same-stations'] },
  {
    name: 'a rule whose every item has a narrower one',
    plan: aPlan([...whole, aRule('r5', 'send', { kind: 'item', item: asId('tomato') }, ['larder'])]),
    findings: ['note rule-all-exceptions'],
  },
  {
    name: 'a rule for a till and an area that never meet',
    plan: aPlan([...whole, aRule('r5', 'send', { kind: 'section', section: asId('salads') }, ['larder'], { tills: [asId('till1')], areas: [asId('terrace')] })]),
    findings: ['check rule-covers-nothing'],
  },
  { name: 'a plan without the pass copy on a site with a pass', plan: aPlan([toGrill, toLarder, sideToLarder]), findings: ['check no-pass-sees-it', 'check station-idle'] },
  {
    name: 'a pass whose printer only one till reaches',
    site: { printers: [aPrinter('GRILL1', '10.20.30.201'), aPrinter('LARDER1', '10.20.30.202'), aPrinter('PASS1', '', { connection: 'usb', hostTill: asId('till1') })] },
    plan: aPlan(whole), findings: ['check copy-lost', 'check no-pass-sees-it'],
  },
  {
    name: 'stand-ins and backups that turn in a circle',
    site: {
      printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('LARDER1') }), aPrinter('LARDER1', '10.20.30.202', { backup: asId('GRILL1') }), aPrinter('PASS1', '10.20.30.210')],
      stations: [aStation('grill', ['GRILL1'], { name: 'Grill', standIn: asId('larder') }), aStation('larder', ['LARDER1'], { name: 'Larder', standIn: asId('grill') }), aStation('pass', ['PASS1'], { name: 'Pass', kind: 'pass' })],
    },
    plan: aPlan(whole), findings: ['note stand-in-circle', 'note backup-circle'],
  },
  {
    name: 'a printer that is only a backup and a station that only stands in',
    site: {
      printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('SPARE1') }), aPrinter('LARDER1', '10.20.30.202'), aPrinter('PASS1', '10.20.30.210'), aPrinter('SPARE1', '10.20.30.211')],
      stations: [aStation('grill', ['GRILL1'], { name: 'Grill', standIn: asId('spare') }), aStation('larder', ['LARDER1'], { name: 'Larder' }), aStation('pass', ['PASS1'], { name: 'Pass', kind: 'pass' }), aStation('spare', ['LARDER1'], { name: 'Spare' })],
    },
    plan: aPlan(whole), findings: ['note station-only-stand-in', 'note printer-only-backup'],
  },
];

describe('what a proof finds', () => {
  it.each(cases)('$name', ({ site, plan, findings }) => {
    expect(found(kitchen(site), plan)).toEqual(findings);
  });

  it('counts a way for each item, option, till and order type', () => {
    const { ways } = provePlan(kitchen(), aPlan(whole));
    expect({ total: ways.total, items: ways.items, options: ways.optionChoices }).toEqual({ total: (2 + 2) * 3, items: 2, options: 2 });
  });

  it('tries two options together when both split and both can be chosen', () => {
    const site = kitchen();
    const plan = aPlan([...whole, aRule('r6', 'split', { kind: 'option', option: asId('chips') }, ['larder'])]);
    expect(provePlan(site, plan).ways.total).toBe((2 + 2) * 3);
    const both = { ...site, menu: { ...site.menu, optionGroups: [aGroup('sides', ['chips', 'side'], { max: 2 })] } };
    expect(provePlan(both, plan).ways.total).toBe((2 + 2 + 1) * 3);
  });

  it('prints the circle as the circle', () => {
    const site = kitchen(cases.find(({ name }) => name.includes('circle'))?.site);
    expect(provePlan(site, aPlan(whole)).findings[0]?.message).toBe('Grill → Larder → Grill. When all of them are closed, their dishes are lost.');
  });

  it('proves the present beside the plan, and tells them apart', () => {
    const present = { ...allWell, closedStations: [asId<never>('larder')] };
    expect(provePlan(kitchen(), aPlan(whole)).findings).toEqual([]);
    expect(provePlan(kitchen(), aPlan(whole), present).findings.map((finding) => finding.code)).toEqual(['station-closed', 'allergy-does-not-reach']);
  });
});
