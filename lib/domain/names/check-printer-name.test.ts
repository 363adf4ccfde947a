import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aStation } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import { checkPrinterName } from './check-printer-name';
import { nameContextOf, type NameSite } from './name-context';

const siteWith = (names: readonly string[], more: Partial<NameSite> = {}): NameSite =>
  aSite({ printers: names.map((name, index) => aPrinter(name, `10.20.30.${201 + index}`, { id: asId(`p${index}`) })), ...more });
const findingsOf = (site: NameSite, index: number) => {
  const printer = site.printers[index]!;
  return checkPrinterName(printer.name, nameContextOf(site, printer));
};

it('says of a space what it means and what to press', () => {
  expect(findingsOf(siteWith(['LARDER 1']), 0)).toEqual([{
    code: 'name-space', severity: 'stop', subject: { kind: 'printer', id: 'p0', field: 'name' },
    title: 'LARDER 1 has a space in its name',
    message: 'Some ordering software cannot print to it. It must read the same on all tills.',
    fixes: [{ kind: 'rename-printer', printer: 'p0', name: 'LARDER1', label: 'Rename to LARDER1' }],
  }]);
});

it('writes out what nobody can see', () => {
  expect(findingsOf(siteWith(['GRILL\u200b1']), 0)[0]?.title).toContain('GRILL[U+200B]1');
});

it('says all there is to say, worst first', () => {
  expect(findingsOf(siteWith(['Küche #1 with a very long name indeed']), 0).map((finding) => finding.code))
    .toEqual(['name-space', 'name-refused', 'name-too-long', 'name-not-ascii']);
});

describe('two printers of one name', () => {
  it('make one finding, on the one listed later', () => {
    const site = siteWith(['GRILL1', 'grill1']);
    expect([findingsOf(site, 0), findingsOf(site, 1).map((finding) => finding.code)]).toEqual([[], ['name-taken']]);
  });
  it('leave the name to the one that is further along', () => {
    const site = aSite({ printers: [aPrinter('GRILL1', '10.20.30.201', { stage: 'planned' }), aPrinter('grill1', '10.20.30.202', { stage: 'signed-off' })] });
    expect(findingsOf(site, 0).map((finding) => finding.code)).toEqual(['name-taken']);
  });
});

it.each([
  ['BAR0', 'BARO', true], ['GRILL1', 'GRILLl', true], ['GRILL1', 'GRILLI', true], ['PI1', 'PlI', true],
  ['BAR0', 'BARo', false], ['GRILL1', 'GRILLi', false], ['GRILL1', 'GRILL2', false],
])('%s and %s look alike before case is folded: %s', (first, second, alike) => {
  expect(findingsOf(siteWith([first, second]), 1).map((finding) => finding.code).includes('name-looks-alike')).toBe(alike);
});

describe('a name that speaks of a station', () => {
  const stations = [aStation('Grill', ['p0']), aStation('Larder', []), aStation('Cold Kitchen', [])];
  it.each([
    ['LARDER1', true], ['larder', true], ['BY-LARDER-2', true], ['COLD-KITCHEN', true],
    ['LARDERS', false], ['COLD1', false], ['KITCHEN-COLD', false], ['GRILL1', false], ['GRILL-LARDER', false], ['HOT1', false],
  ])('%s misleads: %s', (name, misleads) => {
    const findings = findingsOf(siteWith([name], { stations }), 0);
    expect(findings.map((finding) => finding.code).includes('name-of-other-station')).toBe(misleads);
  });
  it('offers the name of the station it prints for', () => {
    expect(findingsOf(siteWith(['LARDER1'], { stations }), 0)[0]?.fixes[0]).toMatchObject({ name: 'GRILL1' });
  });
  it('misleads nobody while the printer prints for no station yet', () => {
    expect(findingsOf(siteWith(['LARDER1'], { stations: [aStation('Larder', [])] }), 0)).toEqual([]);
  });
});

it('follows the site’s own policy', () => {
  const strict = { namingPolicy: { minLength: 4, maxLength: 6, allowUnderscore: false, allowHyphen: false, mustStartWithLetter: false } };
  const codes = (name: string) => findingsOf(siteWith([name], strict), 0).map((finding) => finding.code);
  expect([codes('1GRILL'), codes('GRI'), codes('GRILL12'), codes('GR-1'), codes('GR_1')])
    .toEqual([[], ['name-outside-policy'], ['name-outside-policy'], ['name-outside-policy'], ['name-outside-policy']]);
  expect(findingsOf(siteWith(['GR-1'], strict), 0)[0]).toMatchObject({ message: 'Here a printer name is 4 to 6 letters or digits, starting with a letter or a digit.', fixes: [{ name: 'GR01' }] });
});
