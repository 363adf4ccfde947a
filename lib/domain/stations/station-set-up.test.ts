import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import type { Station } from '@/lib/domain/site/station';
import { aPlan, aPrinter, aRule, aSite, aStation } from '@/tests/fixtures/build-site';
import { dependentsOfStation } from './dependents-of-station';
import { sayStationChange, stationDifferences, stationFacts } from './station-differences';
import { standInChain, stationFindings } from './station-findings';
import { ticketWords } from './station-words';

const grill = aStation('Grill', ['GRILL1', 'SAUCE1'], { mesh: 'square', standIn: asId('Sauce') });
const sauce = aStation('Sauce', ['SAUCE1'], { mesh: 'dots', standIn: asId('Grill') });
const bar = aStation('Bar', ['BAR1'], { mesh: 'bars' });
const naming = { stations: [grill, sauce, bar], printers: [aPrinter('GRILL1', ''), aPrinter('SAUCE1', ''), aPrinter('BAR1', '')] };
const shut = (station: Station): Station => ({ ...station, open: false });

describe('what a station’s own set-up says', () => {
  it('is nothing while it is open and prints', () => {
    expect(stationFindings(naming.stations, grill)).toEqual([]);
  });

  it.each<readonly [string, readonly Station[], Station, string, string]>([
    ['closed with nobody to stand in', [grill, sauce, shut(bar)], shut(bar), 'stop', 'Bar is closed and nobody stands in'],
    ['closed with a stand-in that is closed too', [shut(grill), shut(sauce), bar], shut(grill), 'stop', 'Grill is closed, and so is its stand-in'],
    ['without a printer', [grill, sauce, bar], { ...bar, printers: [] }, 'check', 'Bar has no printer'],
    ['with the mesh of another', [grill, sauce, bar], { ...bar, mesh: 'dots' }, 'check', 'Sauce has this mesh too'],
  ])('is said when it is %s', (_, stations, station, severity, title) => {
    expect(stationFindings(stations, station)).toMatchObject([{ severity, title, subject: { kind: 'station', id: station.id } }]);
  });

  it('ends a chain of stand-ins at the first that is open, and never goes round', () => {
    const larder = aStation('Larder', [], { standIn: grill.id });
    const closed = [shut(grill), sauce, larder];
    expect(standInChain(closed, shut(larder))).toMatchObject({ met: [{ name: 'Grill' }, { name: 'Sauce' }], open: { name: 'Sauce' } });
    expect(standInChain([shut(grill), shut(sauce)], shut(grill)).open).toBeNull();
    expect(stationFindings(closed, shut(larder)).map((finding) => finding.code)).not.toContain('station-closed-alone');
  });
});

describe('a change of a station', () => {
  it.each<readonly [string, Partial<Station>, string]>([
    ['closing', { open: false }, 'Grill closed'],
    ['a new name', { name: 'Char' }, 'Grill renamed to Char'],
    ['the order of its printers', { printers: [asId('SAUCE1'), asId('GRILL1')] }, 'Grill: printers GRILL1, then SAUCE1 to SAUCE1, then GRILL1'],
    ['several at once', { open: false, standIn: null, pace: 20 }, 'Grill closed; stand-in Sauce to nobody, items it can start in 15 minutes not said to 20'],
    ['nothing', {}, 'Grill saved without a change'],
  ])('is one line of history: %s', (_, change, line) => {
    expect(sayStationChange(grill, { ...grill, ...change }, naming)).toBe(line);
  });

  it('is seen field by field', () => {
    expect(stationDifferences(grill, { ...grill, code: 'CH', layout: 'by-seat' }, naming)).toEqual([
      { field: 'code', label: 'Code', from: 'GR', to: 'CH' },
      { field: 'layout', label: 'Ticket', from: 'Dishes by course', to: 'Every seat in turn' },
    ]);
    expect(stationFacts(bar, naming)).toContainEqual({ label: 'Printers', value: 'BAR1' });
    expect([1, 2, 3].map((count) => ticketWords('by-course', count))).toEqual(['Dishes by course', 'Dishes by course, twice', 'Dishes by course, three times']);
  });
});

it('a station stays while plans send to it, and says whose stand-in it was', () => {
  const site = aSite({ stations: naming.stations, plans: [aPlan([aRule('r', 'send', { kind: 'everything' }, ['Sauce'])])] });
  expect(dependentsOfStation(site, sauce.id)).toEqual({
    obstacles: ['Dinner sends dishes or copies to it. Send them elsewhere on the board first.'],
    consequences: ['Grill has no stand-in any more.'],
  });
  expect(dependentsOfStation(site, bar.id)).toEqual({ obstacles: [], consequences: [] });
});
