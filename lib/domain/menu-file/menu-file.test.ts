import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { allergens } from '@/lib/domain/site/menu';
import { asId } from '@/lib/domain/site/ids';
import { aGroup, anItem, anOption, aSection, aSite } from '@/tests/fixtures/build-site';
import { seeded } from '@/tests/fixtures/generated-site';
import { decodeFile } from './decode-file';
import { guessMapping } from './fields';
import { foldName } from './fold-name';
import { readGroups, writeGroups, type GroupText } from './option-cell';
import { planImport, type ImportPlan } from './plan-import';
import { readTable } from './read-table';
import { makeSafe, restore } from './safe-cell';
import { writeMenuFile } from './write-file';

const site = aSite({
  courses: [{ id: asId('mains'), name: 'Mains' }],
  menu: {
    sections: [aSection('burgers', { name: 'Burgers' })],
    items: [anItem('house', 'burgers', { name: 'House burger', kitchenName: 'HOUSE', course: asId('mains'), allergens: ['gluten'], optionGroups: [asId('side')] })],
    optionGroups: [aGroup('side', ['salad'], { name: 'Side' })],
    options: [anOption('salad', 'side', { name: 'Side salad', kitchenName: 'SALAD', allergens: ['mustard'] })],
  },
});

const idsFrom = () => {
  let count = 0;
  return (): string => `new-${(count += 1)}`;
};

const plan = (text: string, on = site): ImportPlan => {
  const reading = readTable(text);
  if (!reading.ok) throw new Error(reading.message);
  return planImport(on, reading.table, guessMapping(reading.table.headings), idsFrom());
};

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);

describe('decoding a file', () => {
  it.each([
    ['a byte-order mark', Uint8Array.of(0xef, 0xbb, 0xbf, 0x61), 'a', 'utf-8'],
    ['UTF-16 as some spreadsheets save it', Uint8Array.of(0xff, 0xfe, 0xe9, 0x00), 'é', 'utf-16le'],
    ['UTF-16, big end first', Uint8Array.of(0xfe, 0xff, 0x00, 0xe9), 'é', 'utf-16be'],
    ['Windows-1252', Uint8Array.of(0x43, 0x72, 0xe8, 0x6d, 0x65, 0x80), 'Crème€', 'windows-1252'],
    ['plain UTF-8', bytes('Crème'), 'Crème', 'utf-8'],
  ])('reads %s', (_, input, text, encoding) => {
    expect(decodeFile(input)).toEqual({ ok: true, text, encoding });
  });

  it.each([
    ['a spreadsheet with another ending', Uint8Array.of(0x50, 0x4b, 0x03, 0x04, 0x14), 'This is a spreadsheet or an archive'],
    ['an old spreadsheet', Uint8Array.of(0xd0, 0xcf, 0x11, 0xe0, 0xa1), 'This is an old spreadsheet'],
    ['bytes that are no text', Uint8Array.of(0x61, 0x00, 0x62), 'This is not a text file.'],
    ['nothing', new Uint8Array(), 'The file is empty.'],
    ['more than 10 MB', new Uint8Array(10_000_001).fill(0x61), 'larger than 10 MB'],
  ])('refuses %s in words', (_, input, words) => {
    const decoded = decodeFile(input);
    expect(decoded.ok ? '' : decoded.message).toContain(words);
  });
});

describe('a dry run', () => {
  it('tells new, changed and unchanged items apart, and keeps what the file does not name', () => {
    const dry = plan('Section;Item;Kitchen name\r\nBurgers;House burger;HOUSE\r\nBurgers;Bean burger;BEAN\r\nSalads;Green;\r\n');
    expect({ creates: dry.creates.map((item) => item.name), updates: dry.updates, unchanged: dry.unchanged, sections: dry.sections.map((section) => section.name), errors: dry.errors })
      .toEqual({ creates: ['Bean burger', 'Green'], updates: [], unchanged: 1, sections: ['Salads'], errors: [] });
    expect(plan('Section,Item,Sold out\nburgers,house burger,yes').updates).toEqual([{ ...site.menu.items[0], name: 'house burger', soldOut: true }]);
  });

  it('says each bad line by its number in the file, with the column and the reason', () => {
    const dry = plan('Section,Item,Course,Sold out,Seconds,Allergens\n"Burgers","Two\nlines",Mains,,,\nBurgers,,,,,\n\nBurgers,A,Pudding,,,\nBurgers,B,,maybe,,\nBurgers,C,,,soon,\nBurgers,D,,,,gluten & nuts\nBurgers,E,,,,\nburgers,e,,,,\n');
    expect(dry.errors.map(({ line, column, reason }) => `${line} ${column}: ${reason}`)).toEqual([
      '2 Item: Item has a line break or another control character in it.',
      '4 Item: Item is empty.',
      '6 Course: This site has no course “Pudding”. Add it to the site, or use one of its own.',
      '7 Sold out: “maybe” is neither yes nor no.',
      '8 Seconds: “soon” is not a whole number from 0 to 86400.',
      '9 Allergens: “gluten & nuts” is no allergen of the list. Nothing is guessed where an allergy is at stake.',
      '11 Item: “e” in burgers stands already on line 10.',
    ]);
  });

  it('shares a group between items, and refuses the same name with other options', () => {
    const dry = plan('Section,Item,Options\nBurgers,A,"Side (0-1): Side salad = SALAD {mustard}"\nBurgers,B,"Heat (1-1): Mild; Hot"\nBurgers,C,"Heat (1-1): Mild; Hot"\nBurgers,D,"Heat (1-1): Mild"\n');
    expect(dry.groups.map((group) => group.name)).toEqual(['Heat']);
    expect(dry.creates.map((item) => item.optionGroups)).toEqual([['side'], [dry.groups[0]!.id], [dry.groups[0]!.id]]);
    expect(dry.errors.map((error) => error.line)).toEqual([5]);
  });

  it.each([
    ['Heat: Mild', 'is fine without limits', undefined],
    ['Side (0-1) Chips', 'has no colon', 'needs one “:”'],
    ['Side (0-1):', 'has no options', 'The group “Side” has no options.'],
    ['Side (3-1): Chips', 'asks for more than it lets', 'asks for at least 3 and at most 1'],
    ['Side (0-60): Chips', 'lets more than fifty', 'at most 50 can be'],
    ['Side (0-1): Chips; chips', 'has an option twice', 'has the option “chips” twice'],
    ['Side (0-1): Chips | side: Rice', 'has a group twice', 'The group “side” stands twice.'],
    ['Side (0-1): Chips {brazil}', 'names no allergen of the list', '“brazil” is no allergen of the list.'],
    ['Side (0-1): Chips {milk', 'leaves a bracket open', 'a bracket that is not closed'],
    [': Chips', 'has no name', 'A group of options has no name.'],
  ])('reads the options “%s”, which %s', (cell, _, words) => {
    const dry = plan(`Section;Item;Options\nBurgers;A;"${cell}"\n`);
    if (words === undefined) expect(dry.errors).toEqual([]);
    else expect(dry.errors).toMatchObject([{ line: 2, column: 'Options', reason: expect.stringContaining(words) as string }]);
  });

  it('takes names for one that the tables take for one, and keeps accents apart', () => {
    const dry = plan('Section;Item\nBurgers;Maßkrug\nburgers;MASSKRUG\nBurgers;Ste\u00adak\nBurgers;Steak\nBurgers;Crème\nBurgers;Creme\nBurgers;Ｆｕｌｌ\nBurgers;full\n');
    expect(dry.errors.map(({ line }) => line)).toEqual([3, 5, 9]);
    expect(dry.creates.map((item) => item.name)).toEqual(['Maßkrug', 'Ste\u00adak', 'Crème', 'Creme', 'Ｆｕｌｌ']);
  });
});

describe('the same menu out and in again', () => {
  it('changes nothing', () => {
    expect(plan(writeMenuFile(site))).toEqual({ sections: [], groups: [], options: [], creates: [], updates: [], unchanged: 1, errors: [] });
  });

  it('brings back any name, whatever a spreadsheet would make of it', () => {
    const name = fc.string({ minLength: 1, maxLength: 40 }).map((text) => text.normalize('NFC').replace(/[\u0000-\u001f\u007f]/g, '').trim()).filter((text) => text !== '');
    fc.assert(fc.property(fc.uniqueArray(name, { minLength: 1, maxLength: 6, selector: foldName }), (names) => {
      const odd = aSite({ menu: { sections: [aSection('s', { name: '=Section' })], items: names.map((one, index) => anItem(`i${index}`, 's', { name: one, kitchenName: one.slice(0, 12).trim() })) } });
      expect(plan(writeMenuFile(odd), odd)).toMatchObject({ creates: [], updates: [], unchanged: names.length, errors: [] });
    }), seeded);
  });

  it('makes every cell safe and gives it back as it was', () => {
    fc.assert(fc.property(fc.oneof(fc.string(), fc.string().map((text) => `'${text}`), fc.constantFrom('=1', "'=1", "''", '-18 freezer', '\t=', "'x")), (cell) => {
      expect(restore(makeSafe(cell))).toBe(cell);
      expect(/^[=+\-@\t\r\n\0]/.test(makeSafe(cell))).toBe(false);
    }), seeded);
  });

  it('writes option groups so that they are read back exactly', () => {
    const words = fc.string({ minLength: 1, maxLength: 12 }).map((text) => text.replace(/[\u0000-\u001f\u007f]/g, '').trim()).filter((text) => text !== '');
    const group = fc.record({
      name: words, min: fc.constantFrom(0, 1), max: fc.constantFrom(1, 2),
      options: fc.uniqueArray(fc.record({ name: words, kitchenName: fc.oneof(fc.constant(''), words), allergens: fc.uniqueArray(fc.constantFrom(...allergens), { maxLength: 2 }).map((some) => allergens.filter((one) => some.includes(one))) }), { minLength: 1, maxLength: 3, selector: (option) => foldName(option.name) }),
    });
    fc.assert(fc.property(fc.uniqueArray(group, { maxLength: 3, selector: ({ name }) => foldName(name) }), (groups: readonly GroupText[]) => {
      expect(readGroups(writeGroups(groups))).toEqual({ ok: true, groups });
    }), seeded);
  });
});
