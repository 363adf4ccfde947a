import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { allWell, type Present } from '@/lib/domain/site/present';
import type { Rule } from '@/lib/domain/site/plan';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { explainLine } from './explain';
import { routeLine } from './route-line';
import { prepareRouting } from './routing';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('till2', 'room', '10.20.30.62', { name: 'Till 2' })],
  printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('SAUCE1') }), aPrinter('LARDER1', '10.20.30.202'), aPrinter('SAUCE1', '10.20.30.203')],
  stations: [aStation('grill', ['GRILL1'], { name: 'Grill', standIn: asId('sauce') }), aStation('larder', ['LARDER1'], { name: 'Larder', position: 1 }), aStation('sauce', ['SAUCE1'], { name: 'Sauce', position: 2 })],
  menu: {
    sections: [aSection('burgers', { name: 'Burgers' })],
    items: [anItem('house', 'burgers', { name: 'House burger', optionGroups: [asId('side')] })],
    optionGroups: [aGroup('side', ['salad'])], options: [anOption('salad', 'side', { name: 'side salad' })],
  },
});
const burgers = aRule('r1', 'send', { kind: 'section', section: asId('burgers') }, ['grill']);
const salad = aRule('r2', 'split', { kind: 'option', option: asId('salad') }, ['larder']);

const explained = (rules: readonly Rule[], present: Partial<Present> = {}): readonly string[] => {
  const route = routeLine(prepareRouting(site, aPlan(rules), { ...allWell, ...present }), asId('house'), [asId('salad')], { orderType: 'eat-in', area: asId('room'), till: asId('till2') });
  return explainLine(route, site).map(({ step, subject, rest }) => `${step} ${subject}${rest}`);
};

describe('explaining a line', () => {
  it('says in five sentences why a burger is on two tickets', () => {
    expect(explained([burgers, salad])).toEqual([
      '1 Burgers goes to Grill.',
      '2 No narrower rule for Till 2, Main room, to eat in.',
      '3 side salad splits to Larder and names its dish.',
      '6 GRILL1 and LARDER1 answer from Till 2.',
      '7 Every station that cooks it gets its ticket.',
    ]);
  });

  it('says over which rule another won, and by what', () => {
    const atTill = aRule('r3', 'send', { kind: 'section', section: asId('burgers') }, ['sauce'], { tills: [asId('till2')] });
    expect(explained([burgers, atTill])).toContain('2 It wins over “Burgers to Grill”, because it names the till.');
  });

  it('says what was closed, and who stands in', () => {
    expect(explained([burgers], { closedStations: [asId('grill')] })).toContain('5 Grill is closed, Sauce stands in.');
  });

  it('says which backup prints, and why', () => {
    expect(explained([burgers], { downPrinters: [asId('GRILL1')] })).toContain('6 SAUCE1 prints for Grill, since GRILL1 is down.');
  });

  it('says where a part is lost', () => {
    const lost = explained([burgers, salad], { downPrinters: [asId('LARDER1')] });
    expect(lost).toContain('6 Larder prints nowhere: LARDER1 is down.');
    expect(lost.at(-1)).toBe('7 Part lost. Nothing prints for Larder.');
  });

  it('says that no rule sends it anywhere', () => {
    expect(explained([])).toEqual(['1 House burger has no rule that sends it to a station.', '7 Lost. No kitchen ticket prints for this line.']);
  });
});
