import { beforeEach, describe, expect, it } from 'vitest';
import { createSection } from '@/features/menu/server/create-section';
import { exportMenu } from '@/features/menu/server/export-menu';
import { importMenu } from '@/features/menu/server/import-menu';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Item } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import { AppError } from '@/lib/http/errors';
import type { Actor } from '@/lib/server/actor';
import { loadSite } from '@/lib/server/site-snapshot';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const as = (role: Role): Actor => ({ person: { id: 'ines-okafor', name: 'Ines Okafor', email: '' }, membership: { role, mayOverride: false, title: '' }, siteId });
const chef = as('chef');
const site = async (): Promise<Site> => (await loadSite(siteId))!;
const itemCalled = async (name: string): Promise<Item> => (await site()).menu.items.find((item) => item.name === name)!;
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);
const bring = (text: string, apply?: string, mapping?: object) => importMenu(chef, { bytes: Buffer.from(text), mapping: mapping === undefined ? undefined : JSON.stringify(mapping), apply });

describe('a menu file', () => {
  it('changes nothing on a dry run, and is applied whole to the menu it was checked against', async () => {
    const before = await site();
    const text = 'Section;Item;Course\nSoups;Leek soup;Starters\nBurgers;House burger;Mains\n';
    const dry = await bring(text);
    expect(dry).toMatchObject({ creates: 1, unchanged: 1, sections: ['Soups'], errorCount: 0, applied: false });
    expect(await site()).toEqual(before);
    expect(await bring(text, dry.digest)).toMatchObject({ applied: true });
    expect(await itemCalled('Leek soup')).toMatchObject({ name: 'Leek soup' });
  });

  it('is refused whole when the menu moved on, or when a line has a fault', async () => {
    const text = 'Section,Item\nSoups,Leek soup\n';
    const { digest } = await bring(text);
    await createSection(chef, { name: 'Broths' });
    expect(await refused(bring(text, digest))).toMatchObject({ code: 'stale' });
    const faulty = await bring('Section,Item\nSoups,\n');
    expect(await refused(bring('Section,Item\nSoups,\n', faulty.digest))).toMatchObject({ code: 'invalid' });
    expect((await site()).menu.sections.map((section) => section.name)).not.toContain('Soups');
  });

  it('says in words what is no table', async () => {
    expect(await refused(importMenu(chef, { bytes: Uint8Array.of(0x50, 0x4b, 3, 4), mapping: undefined, apply: undefined }))).toBeInstanceOf(AppError);
    expect(await refused(bring('Section,Item\n"Soups,Leek\n'))).toMatchObject({ code: 'invalid' });
  });

  it('of the menu itself, taken out and brought in again, changes nothing', async () => {
    const text = await (await exportMenu(as('trainer'))).text();
    const { menu } = await site();
    expect(await bring(text)).toMatchObject({ creates: 0, updates: 0, unchanged: menu.items.length, errorCount: 0 });
  });

  it('changes what it names and nothing else, with new versions and the same places', async () => {
    const before = await site();
    const burger = await itemCalled('House burger');
    const dry = await bring('Section,Item,Sold out,Left\nBurgers,House burger,yes,4\n');
    expect(dry).toMatchObject({ creates: 0, updates: 1, changes: [{ name: 'House burger', what: 'left nothing to 4; sold out no to yes' }] });
    await bring('Section,Item,Sold out,Left\nBurgers,House burger,yes,4\n', dry.digest);
    const expected = before.menu.items.map((item) => (item.id === burger.id ? { ...item, soldOut: true, left: 4, version: item.version + 1 } : item));
    expect((await site()).menu).toEqual({ ...before.menu, items: expected });
  });

  it('brings new options in once, for all the items that come with them', async () => {
    const text = 'Section;Item;Options\nSoups;Leek;"Bread (0-1): Rye = RYE {gluten}; None"\nSoups;Pea;"Bread (0-1): Rye = RYE {gluten}; None | Steak (1-1): rare; medium rare; medium; medium well; well done"\n';
    const { digest } = await bring(text);
    expect(await bring(text, digest)).toMatchObject({ creates: 2, groups: ['Bread'], errorCount: 0 });
    const { menu } = await site();
    const bread = menu.optionGroups.find((group) => group.name === 'Bread')!;
    expect(menu.options.filter((option) => option.group === bread.id)).toMatchObject([{ name: 'Rye', kitchenName: 'RYE', allergens: ['gluten'] }, { name: 'None' }]);
    expect((await itemCalled('Pea')).optionGroups).toEqual([bread.id, menu.optionGroups.find((group) => group.name === 'Steak')!.id]);
  });

  it('is read by the columns a person chose, and refuses columns that are not there', async () => {
    const nowhere = { kitchenName: null, course: null, allergens: null, preparationSeconds: null, soldOut: null, left: null, noTicket: null, options: null };
    expect(await bring('What,Where\nLeek,Soups\n', undefined, { ...nowhere, name: 0, section: 1 })).toMatchObject({ creates: 1, sections: ['Soups'] });
    for (const wrong of [{ ...nowhere, name: 0, section: 7 }, { name: 0 }, ['x']]) expect(await refused(bring('What,Where\nLeek,Soups\n', undefined, wrong))).toMatchObject({ code: 'invalid' });
  });

  it('is not for installers and trainers to bring in, and for all of them to take out', async () => {
    const request = { bytes: Buffer.from('Section,Item\nSoups,Leek\n'), mapping: undefined, apply: undefined };
    for (const role of ['installer', 'trainer'] as const) {
      expect(await refused(importMenu(as(role), request))).toMatchObject({ code: 'not-allowed' });
      expect((await exportMenu(as(role))).headers.get('Content-Disposition')).toBe('attachment; filename="lantern-yard-menu.csv"');
    }
  });

  it('of 5,000 items is applied whole, and applied again with changes to every one', async () => {
    const text = ['Section,Item,Kitchen name', ...Array.from({ length: 5_000 }, (_, index) => `Big ${index % 50},Dish ${index},D${index}`)].join('\n');
    const { digest } = await bring(text);
    expect(await bring(text, digest)).toMatchObject({ creates: 5_000, applied: true });
    expect((await site()).menu.items.filter((item) => item.name.startsWith('Dish '))).toHaveLength(5_000);
    const changed = `${text.replaceAll(/,D(\d+)$/gm, ',K$1')}`;
    const again = await bring(changed);
    expect(await bring(changed, again.digest)).toMatchObject({ creates: 0, updates: 5_000, applied: true });
    expect((await site()).menu.items.filter((item) => item.kitchenName.startsWith('K') && item.version === 2)).toHaveLength(5_000);
  });
});
