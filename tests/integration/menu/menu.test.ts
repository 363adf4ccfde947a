import { beforeEach, describe, expect, it } from 'vitest';
import { inputOf } from '@/features/menu/menu-view';
import { exportMenu, importMenu } from '@/features/menu/server/import-menu';
import { createItems, deleteItem, orderItems, updateItem } from '@/features/menu/server/items';
import { createOptionGroup, deleteOptionGroup, updateOptionGroup } from '@/features/menu/server/option-groups';
import { createSection, deleteSection, orderSections, renameSection } from '@/features/menu/server/sections';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Item } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import { AppError } from '@/lib/http/errors';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { loadSite } from '@/lib/server/site-snapshot';
import { StaleWrite } from '@/lib/server/versioned-update';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const as = (role: Role): Actor => ({ person: { id: 'ines-okafor', name: 'Ines Okafor', email: '' }, membership: { role, mayOverride: false, title: '' }, siteId });
const chef = as('chef');
const site = async (): Promise<Site> => (await loadSite(siteId))!;
const itemCalled = async (name: string): Promise<Item> => (await site()).menu.items.find((item) => item.name === name)!;
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);
const bytes = (text: string): Uint8Array => Buffer.from(text);
const bring = (text: string, apply?: string) => importMenu(chef, { bytes: bytes(text), mapping: undefined, apply });

describe('menu sections', () => {
  it('are added at the end, renamed against their version, put in order and deleted when empty', async () => {
    const { id, version } = await createSection(chef, { name: 'Soups' });
    expect((await site()).menu.sections.at(-1)).toMatchObject({ id, name: 'Soups' });
    expect(await refused(renameSection(chef, id, 7, { name: 'Broths' }))).toBeInstanceOf(StaleWrite);
    await renameSection(chef, id, version, { name: 'Broths' });
    const ids = (await site()).menu.sections.map((section) => section.id as string);
    await orderSections(chef, [id, ...ids.filter((one) => one !== id)]);
    expect((await site()).menu.sections[0]?.name).toBe('Broths');
    await deleteSection(chef, id, 2);
    expect((await site()).menu.sections.map((section) => section.name)).not.toContain('Broths');
  });

  it('stay while they have items', async () => {
    const section = (await site()).menu.sections[0]!;
    expect(await refused(deleteSection(chef, section.id, section.version))).toMatchObject({ code: 'conflict' });
  });

  it('are not for installers and trainers to change', async () => {
    for (const role of ['installer', 'trainer'] as const) expect(await refused(createSection(as(role), { name: 'Soups' }))).toMatchObject({ code: 'not-allowed' });
  });
});

describe('items', () => {
  it('are pasted all or none', async () => {
    const like = inputOf(await itemCalled('House burger'));
    const before = (await site()).menu.items.length;
    expect(await refused(createItems(chef, [{ ...like, name: 'New one' }, { ...like, name: 'House burger' }]))).not.toBe('done');
    expect((await site()).menu.items).toHaveLength(before);
    await createItems(chef, [{ ...like, name: 'New one' }, { ...like, name: 'New two' }]);
    expect((await site()).menu.items).toHaveLength(before + 2);
    expect((await itemCalled('New two')).optionGroups).toEqual(like.optionGroups);
  });

  it('keep what somebody else saved first, and say who', async () => {
    const burger = await itemCalled('House burger');
    await updateItem(chef, burger.id, burger.version, { ...inputOf(burger), soldOut: true });
    const error = await refused(updateItem(chef, burger.id, burger.version, { ...inputOf(burger), name: 'Other' }));
    expect(error).toBeInstanceOf(StaleWrite);
    expect(await itemCalled('House burger')).toMatchObject({ soldOut: true, version: burger.version + 1 });
    expect(await lastChangeOf(siteId, 'item', burger.id)).toMatchObject({ by: 'Ines Okafor', summary: 'House burger changed on the menu' });
  });

  it('of another site cannot be given as a section', async () => {
    expect(await refused(createItems(chef, [{ ...inputOf(await itemCalled('House burger')), name: 'X', section: 'breads' }]))).not.toBe('done');
  });

  it('are put in order within their section and taken off', async () => {
    const { menu } = await site();
    const own = menu.items.filter((item) => item.section === menu.sections[0]!.id);
    await orderItems(chef, own.map((item) => item.id as string).toReversed());
    const after = (await site()).menu.items.filter((item) => item.section === menu.sections[0]!.id);
    expect(after.map((item) => item.id)).toEqual(own.map((item) => item.id).toReversed());
    await deleteItem(chef, own[0]!.id, own[0]!.version);
    expect((await site()).menu.items).toHaveLength(menu.items.length - 1);
  });
});

describe('option groups', () => {
  const group = { name: 'Sauces', min: 0, max: 1, options: [{ id: null, name: 'Pepper', kitchenName: '', allergens: [] }, { id: null, name: 'Mint', kitchenName: '', allergens: [] }] };

  it('keep the ids of their options, so that rules go on speaking of them', async () => {
    const { id, version } = await createOptionGroup(chef, group);
    const [pepper] = (await site()).menu.options.filter((option) => option.group === id);
    await updateOptionGroup(chef, id, version, { ...group, options: [{ ...group.options[0]!, id: pepper!.id, name: 'Green pepper' }] });
    expect((await site()).menu.options.filter((option) => option.group === id)).toMatchObject([{ id: pepper!.id, name: 'Green pepper' }]);
    await deleteOptionGroup(chef, id, version + 1);
    expect((await site()).menu.optionGroups.map((one) => one.id)).not.toContain(id);
  });

  it('do not lose an option that a rule splits', async () => {
    const { menu, plans } = await site();
    const split = plans.flatMap((plan) => plan.rules).find((rule) => rule.kind === 'split')!;
    const option = menu.options.find((one) => 'option' in split.target && one.id === split.target.option)!;
    const owner = menu.optionGroups.find((one) => one.id === option.group)!;
    const kept = menu.options.filter((one) => one.group === owner.id && one.id !== option.id).map(({ id, name, kitchenName, allergens }) => ({ id, name, kitchenName, allergens: [...allergens] }));
    expect(await refused(updateOptionGroup(chef, owner.id, owner.version, { name: owner.name, min: owner.min, max: owner.max, options: kept }))).toMatchObject({ code: 'conflict' });
    expect((await site()).menu.options.map((one) => one.id)).toContain(option.id);
  });
});

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

  it('of 5,000 items is applied whole', async () => {
    const text = ['Section,Item,Kitchen name', ...Array.from({ length: 5_000 }, (_, index) => `Big ${index % 50},Dish ${index},D${index}`)].join('\n');
    const { digest } = await bring(text);
    expect(await bring(text, digest)).toMatchObject({ creates: 5_000, applied: true });
    expect((await site()).menu.items.filter((item) => item.name.startsWith('Dish '))).toHaveLength(5_000);
  });
});
