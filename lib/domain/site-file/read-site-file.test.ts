import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { generated, seeded } from '@/tests/fixtures/generated-site';
import { depthOf, readSiteFile, writeSiteFile } from './read-site-file';
import { siteFileJsonSchema } from './schema';

const whole = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('till1', 'room', '10.20.30.61')],
  printers: [aPrinter('GRILL1', '10.20.30.201')],
  stations: [aStation('grill', ['GRILL1'])],
  menu: { sections: [aSection('burgers')], items: [anItem('burger', 'burgers')] },
  plans: [aPlan([aRule('r1', 'send', { kind: 'section', section: asId('burgers') }, ['grill'])])],
});

type Json = { [key: string]: Json } & Json[];

/** The document with one value put at a path, "+" meaning the end of a list. */
const withChange = (path: string, value: unknown): string => {
  const document = JSON.parse(writeSiteFile(whole)) as Json;
  const steps = path.split('.');
  const last = steps.pop()!;
  const place = steps.reduce((at, step) => at[step as never] as Json, document);
  if (last === '+') place.push(value as Json);
  else Object.assign(place, { [last]: value });
  return JSON.stringify(document);
};

const faultsOf = (text: string): readonly string[] => {
  const reading = readSiteFile(text);
  return reading.ok ? [] : reading.faults.map((fault) => `${fault.path}: ${fault.message}`);
};

describe('reading a site file', () => {
  it('gives back exactly what was written', () => {
    fc.assert(fc.property(generated, ({ site, plan }) => {
      const full = { ...site, plans: [plan] };
      expect(readSiteFile(writeSiteFile(full))).toEqual({ ok: true, site: full });
    }), { ...seeded, numRuns: 60 });
  });

  it.each<[string, string, string]>([
    ['text that is not JSON', '{"tamisSiteFile": 1,', ': The file is not JSON. Export it again, or mend it in a text editor.'],
    ['some other JSON', '{"name": "x"}', 'tamisSiteFile: This is not a site file: it does not say so in “tamisSiteFile”.'],
    ['another version', '{"tamisSiteFile": 7}', 'tamisSiteFile: The file is of version 7, and this program reads version 1.'],
    ['a maze', '['.repeat(100_000), ': The file nests deeper than 32 levels, which this format never does. Nothing was read.'],
    ['far too much', ' '.repeat(10_000_001), ': The file is larger than 10 MB, which no site needs. Nothing was read.'],
    ['an area that does not exist', withChange('site.tills.0.area', 'cellar'), 'site.tills[0].area: There is no area with the id “cellar”.'],
    ['a rule to no station', withChange('site.plans.0.rules.0.stations', ['oven']), 'site.plans[0].rules[0].stations[0]: There is no station with the id “oven”.'],
    ['a section that does not exist', withChange('site.plans.0.rules.0.target.section', 'soups'), 'site.plans[0].rules[0].target.section: There is no section with the id “soups”.'],
    ['a name twice', withChange('site.printers.+', { ...aPrinter('x', '10.20.30.202'), name: 'grill1' }), 'site.printers[1]: The printer name “grill1” stands already at site.printers[0].'],
    ['an id twice', withChange('site.stations.+', { ...aStation('grill', []), name: 'Other', code: 'XY' }), 'site.stations[1]: The id “grill” stands already at site.stations[0].'],
    ['a till that prints through itself', withChange('site.tills.0.printsThrough', 'till1'), 'site.tills[0].printsThrough: till1 prints through others that print through it: nobody prints.'],
  ])('refuses %s with the path of the fault', (_, text, fault) => {
    expect(faultsOf(text)).toContain(fault);
  });

  it('names every field of the wrong kind, and fields it does not know', () => {
    expect(faultsOf(withChange('site.tills', 'none')).some((fault) => fault.startsWith('site.tills: '))).toBe(true);
    expect(faultsOf(withChange('site.colour', 'red')).some((fault) => fault.includes('colour'))).toBe(true);
  });

  it('never throws, whatever it is given', () => {
    fc.assert(fc.property(fc.oneof(fc.string(), fc.json(), fc.json().map((json) => `{"tamisSiteFile":1,"site":${json}}`)), (text) => {
      expect(readSiteFile(text).ok).toBe(false);
    }), { ...seeded, numRuns: 300 });
  });

  it('does not take brackets in names for depth', () => {
    expect(depthOf('{"a":"[[[[\\"[[","b":[1]}')).toBe(2);
  });

  it('publishes the rules it reads by as a JSON Schema', () => {
    expect(siteFileJsonSchema()).toMatchObject({ $schema: 'https://json-schema.org/draft/2020-12/schema', required: ['tamisSiteFile', 'site'] });
  });
});
