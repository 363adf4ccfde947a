import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import type { Finding } from '../findings/finding';
import { compileReach } from '../reach/compile-reach';
import { asId } from '../site/ids';
import type { Printer } from '../site/printer';
import type { Station } from '../site/station';
import { platesOf, standInWords } from './plates';

const bar = aStation('Bar', ['BAR2', 'BAR1']);
const site = aSite({
  areas: [{ id: asId('main'), name: 'Main room', version: 1 }, { id: asId('terrace'), name: 'Terrace', version: 1 }],
  tills: [aTill('Till 1', 'main', '10.20.30.11'), aTill('Till 2', 'main', '10.20.30.12'), aTill('Till 3', 'terrace', '10.20.30.13')],
  printers: [
    aPrinter('BAR1', '10.20.30.205'),
    aPrinter('BAR2', '', { connection: 'usb', hostTill: asId('Till 3') }),
    aPrinter('GRILL1', '10.20.30.201', { backup: asId('BAR1') }),
  ],
  stations: [bar, aStation('Grill', ['GRILL1'], { standIn: asId('Bar') })],
});

const plates = (station: Station, findings: readonly Finding[] = [], change: Partial<Printer> = {}): readonly string[] => {
  const changed = { ...site, printers: site.printers.map((printer) => ({ ...printer, ...change })) };
  return platesOf(changed, station, findings, compileReach(changed)).map((plate) => `${plate.name} ${plate.tag.words}, ${plate.where}: ${plate.quiet}`);
};
const grill = aStation('Grill', ['GRILL1']);
const wrong = (field: string): Finding => ({
  code: 'any', severity: 'stop', subject: { kind: 'printer', id: 'GRILL1', field }, title: 'GRILL1 is wrong', message: '',
  fixes: [{ kind: 'rename-printer', printer: 'GRILL1', name: 'GRILL2', label: 'Rename to GRILL2' }],
});

describe('the plates of a station', () => {
  it('begin with the printer that most tills print on, and say whose tickets the others get first', () => {
    expect(plates(bar)).toEqual(['BAR1 Printing, 10.20.30.205: No backup', 'BAR2 Printing, USB on Till 3: First for Terrace']);
  });

  it('say of a printer that no till reaches first when it is used', () => {
    expect(plates(aStation('Grill', ['GRILL1', 'BAR1']))).toEqual(['GRILL1 Printing, 10.20.30.201: Backup BAR1', 'BAR1 Printing, 10.20.30.205: Only when GRILL1 is out']);
  });

  it('are none for a station without a printer', () => {
    expect(plates(aStation('Grill', []))).toEqual([]);
  });
});

describe('how a printer is', () => {
  it.each<readonly [string, readonly Finding[], Partial<Printer>]>([
    ['Not tested', [], { stage: 'reachable' }],
    ['Printing', [], { stage: 'signed-off' }],
    ['Fix name', [wrong('name')], {}],
    ['Fix address', [wrong('address')], {}],
    ['Down', [wrong('name')], { downSince: '2026-12-01T19:00:00.000Z' }],
    ['Not tested', [{ ...wrong('name'), severity: 'check' }], { stage: 'planned' }],
  ])('%s', (words, findings, change) => {
    expect(plates(grill, findings, change)[0]).toContain(`GRILL1 ${words},`);
  });

  it('carries the mend of what is wrong', () => {
    const [plate] = platesOf(site, grill, [wrong('name')], compileReach(site));
    expect(plate?.wrong).toMatchObject({ words: 'GRILL1 is wrong', fix: { label: 'Rename to GRILL2' } });
  });
});

it('a station says who stands in for it, and first that it is closed', () => {
  expect(site.stations.map((station) => standInWords(station, site))).toEqual(['No stand-in', 'Stand-in Bar']);
  expect(standInWords({ ...bar, open: false }, site)).toBe('Closed, no stand-in');
});
