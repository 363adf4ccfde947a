import { beforeEach, describe, expect, it } from 'vitest';
import { inputOf } from '@/features/menu/menu-view';
import { createItems } from '@/features/menu/server/create-items';
import { createOptionGroup } from '@/features/menu/server/create-option-group';
import { createSection } from '@/features/menu/server/create-section';
import { deleteItem } from '@/features/menu/server/delete-item';
import { deleteOptionGroup } from '@/features/menu/server/delete-option-group';
import { deleteSection } from '@/features/menu/server/delete-section';
import { orderItems } from '@/features/menu/server/order-items';
import { orderSections } from '@/features/menu/server/order-sections';
import { pasteItems } from '@/features/menu/server/paste-items';
import { readItem } from '@/features/menu/server/read-item';
import { renameSection } from '@/features/menu/server/rename-section';
import { updateItem } from '@/features/menu/server/update-item';
import { updateOptionGroup } from '@/features/menu/server/update-option-group';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Item, Option } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
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
const optionsOf = async (group: string): Promise<readonly Option[]> => (await site()).menu.options.filter((option) => option.group === group);

describe('menu sections', () => {
  it('are added at the end, renamed against their version, put in order and deleted when empty', async () => {
    const { id, version } = await createSection(chef, { name: 'Soups' });
    expect((await site()).menu.sections.at(-1)).toMatchObject({ id, name: 'Soups' });
    expect(await refused(renameSection(chef, { section: id, version: 7, name: 'Broths' }))).toBeInstanceOf(StaleWrite);
    await renameSection(chef, { section: id, version, name: 'Broths' });
    const ids = (await site()).menu.sections.map((section) => section.id as string);
    await orderSections(chef, [id, ...ids.filter((one) => one !== id)]);
    expect((await site()).menu.sections[0]?.name).toBe('Broths');
    await deleteSection(chef, { section: id, version: 2 });
    expect((await site()).menu.sections.map((section) => section.name)).not.toContain('Broths');
  });

  it('are put in order all together, or not at all', async () => {
    const ids = (await site()).menu.sections.map((section) => section.id as string);
    expect(await refused(orderSections(chef, ids.slice(1)))).toMatchObject({ code: 'conflict' });
    expect(await refused(orderSections(chef, [...ids.slice(1), 'breads']))).toMatchObject({ code: 'conflict' });
    expect((await site()).menu.sections.map((section) => section.id)).toEqual(ids);
  });

  it('do not share a heading, whatever its letters', async () => {
    const [first] = (await site()).menu.sections;
    expect(await refused(createSection(chef, { name: first!.name.toUpperCase() }))).toMatchObject({ code: 'invalid', details: { fields: [{ field: 'name', reason: `The menu has a section called “${first!.name}” already.` }] } });
  });

  it('stay while they have items, and while a plan has a rule for them', async () => {
    const section = (await site()).menu.sections[0]!;
    expect(String(await refused(deleteSection(chef, { section: section.id, version: section.version })))).toContain('18 items');
    for (const item of (await site()).menu.items.filter((one) => one.section === section.id)) await updateItem(chef, { item: item.id, version: item.version, input: { ...inputOf(item), section: 'fish' } });
    expect(String(await refused(deleteSection(chef, { section: section.id, version: section.version })))).toMatch(/have rules for this section/);
  });
});

describe('items', () => {
  it('are added all or none, and say in words which name is taken', async () => {
    const like = inputOf(await itemCalled('House burger'));
    const before = (await site()).menu.items.length;
    const error = await refused(createItems(chef, [{ ...like, name: 'New one' }, { ...like, name: 'house burger' }]));
    expect(error).toMatchObject({ code: 'invalid', details: { fields: [{ field: 'name', reason: 'Burgers has “House burger” already.' }] } });
    expect((await site()).menu.items).toHaveLength(before);
    await createItems(chef, [{ ...like, name: 'New one' }, { ...like, name: 'New two' }]);
    expect((await site()).menu.items).toHaveLength(before + 2);
    expect((await itemCalled('New two')).optionGroups).toEqual(like.optionGroups);
  });

  it('keep what somebody else saved first, and say who and what', async () => {
    const burger = await itemCalled('House burger');
    await updateItem(chef, { item: burger.id, version: burger.version, input: { ...inputOf(burger), soldOut: true } });
    expect(await refused(updateItem(chef, { item: burger.id, version: burger.version, input: { ...inputOf(burger), name: 'Other' } }))).toBeInstanceOf(StaleWrite);
    expect(await itemCalled('House burger')).toMatchObject({ soldOut: true, version: burger.version + 1 });
    expect(await lastChangeOf(siteId, 'item', burger.id)).toMatchObject({ by: 'Ines Okafor', summary: 'House burger is sold out' });
    expect(await readItem(as('trainer'), burger.id)).toEqual({ id: burger.id, version: burger.version + 1, item: { ...inputOf(burger), soldOut: true } });
  });

  it('are pasted over lines that are there and as new ones, in one go, and may swap their names', async () => {
    const [house, bean] = (await site()).menu.items.filter((item) => item.section === 'burgers');
    const lay = (item: Item, name: string) => ({ id: item.id as string, version: item.version, item: { ...inputOf(item), name } });
    const pasted = await pasteItems(chef, { updates: [lay(house!, bean!.name), lay(bean!, house!.name)], creates: [{ ...inputOf(house!), name: 'Pasted' }] });
    expect(pasted.updates).toEqual([{ id: house!.id, version: house!.version + 1 }, { id: bean!.id, version: bean!.version + 1 }]);
    const after = (await site()).menu.items.filter((item) => item.section === 'burgers').map((item) => item.name);
    expect([after[0], after[1], after.at(-1)]).toEqual([bean!.name, house!.name, 'Pasted']);
  });

  it('are pasted not at all when one line was changed by somebody else', async () => {
    const [house, bean] = (await site()).menu.items.filter((item) => item.section === 'burgers');
    await updateItem(chef, { item: bean!.id, version: bean!.version, input: { ...inputOf(bean!), left: 3 } });
    const before = await site();
    const updates = [house!, bean!].map((item) => ({ id: item.id as string, version: item.version, item: { ...inputOf(item), soldOut: true } }));
    expect(await refused(pasteItems(chef, { updates, creates: [{ ...inputOf(house!), name: 'Pasted' }] }))).toBeInstanceOf(StaleWrite);
    expect(await site()).toEqual(before);
  });

  it('of another site cannot be given as a section', async () => {
    expect(await refused(createItems(chef, [{ ...inputOf(await itemCalled('House burger')), name: 'X', section: 'breads' }]))).not.toBe('done');
  });

  it('are put in order within their section, all of them, and taken off', async () => {
    const { menu } = await site();
    const own = menu.items.filter((item) => item.section === menu.sections[0]!.id);
    await orderItems(chef, own.map((item) => item.id as string).toReversed());
    const after = (await site()).menu.items.filter((item) => item.section === menu.sections[0]!.id);
    expect(after.map((item) => item.id)).toEqual(own.map((item) => item.id).toReversed());
    expect(await refused(orderItems(chef, own.slice(1).map((item) => item.id as string)))).toMatchObject({ code: 'conflict' });
    await deleteItem(chef, { item: own[0]!.id, version: own[0]!.version });
    expect((await site()).menu.items).toHaveLength(menu.items.length - 1);
  });
});

describe('option groups', () => {
  const option = (name: string, id: string | null = null) => ({ id, name, kitchenName: '', allergens: [] });
  const group = { name: 'Sauces', min: 0, max: 1, options: [option('Pepper'), option('Mint')] };

  it('keep the ids of their options, so that rules go on speaking of them', async () => {
    const { id, version } = await createOptionGroup(chef, group);
    const [pepper] = await optionsOf(id);
    await updateOptionGroup(chef, { group: id, version, input: { ...group, options: [option('Green pepper', pepper!.id)] } });
    expect(await optionsOf(id)).toMatchObject([{ id: pepper!.id, name: 'Green pepper' }]);
    await deleteOptionGroup(chef, { group: id, version: version + 1 });
    expect((await site()).menu.optionGroups.map((one) => one.id)).not.toContain(id);
  });

  it('let two options swap their names and their places', async () => {
    const { id, version } = await createOptionGroup(chef, group);
    const [pepper, mint] = await optionsOf(id);
    await updateOptionGroup(chef, { group: id, version, input: { ...group, options: [option('Pepper', mint!.id), option('Mint', pepper!.id)] } });
    expect((await optionsOf(id)).map((one) => [one.id, one.name])).toEqual([[mint!.id, 'Pepper'], [pepper!.id, 'Mint']]);
  });

  it('refuse a name that is taken, and an option that stands twice, on its field', async () => {
    await createOptionGroup(chef, group);
    expect(await refused(createOptionGroup(chef, { ...group, name: 'sauces' }))).toMatchObject({ code: 'invalid', details: { fields: [{ field: 'name' }] } });
    expect(await refused(createOptionGroup(chef, { ...group, name: 'More', options: [option('Mint'), option('MINT')] }))).toMatchObject({ code: 'invalid', details: { fields: [{ field: 'options.1.name' }] } });
  });

  it('are kept as somebody else saved them', async () => {
    const { id, version } = await createOptionGroup(chef, group);
    await updateOptionGroup(chef, { group: id, version, input: { ...group, max: 2 } });
    expect(await refused(updateOptionGroup(chef, { group: id, version, input: { ...group, name: 'Mine' } }))).toBeInstanceOf(StaleWrite);
    expect((await site()).menu.optionGroups.find((one) => one.id === id)).toMatchObject({ name: 'Sauces', max: 2 });
  });

  it('do not lose an option that a rule splits, nor go while items come with them', async () => {
    const { menu, plans } = await site();
    const split = plans.flatMap((plan) => plan.rules).find((rule) => rule.kind === 'split')!;
    const named = menu.options.find((one) => 'option' in split.target && one.id === split.target.option)!;
    const owner = menu.optionGroups.find((one) => one.id === named.group)!;
    const kept = menu.options.filter((one) => one.group === owner.id && one.id !== named.id).map((one) => option(one.name, one.id));
    expect(String(await refused(updateOptionGroup(chef, { group: owner.id, version: owner.version, input: { name: owner.name, min: owner.min, max: owner.max, options: kept } })))).toContain(named.name);
    expect(await refused(deleteOptionGroup(chef, { group: owner.id, version: owner.version }))).toMatchObject({ code: 'conflict' });
    expect((await site()).menu).toEqual(menu);
  });
});

it.each<readonly [string, (actor: Actor) => Promise<unknown>]>([
  ['add a section', (actor) => createSection(actor, { name: 'Soups' })],
  ['rename a section', (actor) => renameSection(actor, { section: 'burgers', version: 1, name: 'Buns' })],
  ['delete a section', (actor) => deleteSection(actor, { section: 'burgers', version: 1 })],
  ['put sections in order', (actor) => orderSections(actor, ['burgers'])],
  ['add an item', async (actor) => createItems(actor, [{ ...inputOf(await itemCalled('House burger')), name: 'X' }])],
  ['change an item', async (actor) => updateItem(actor, { item: (await itemCalled('House burger')).id, version: 1, input: inputOf(await itemCalled('House burger')) })],
  ['paste items', async (actor) => pasteItems(actor, { updates: [], creates: [{ ...inputOf(await itemCalled('House burger')), name: 'X' }] })],
  ['delete an item', async (actor) => deleteItem(actor, { item: (await itemCalled('House burger')).id, version: 1 })],
  ['put items in order', (actor) => orderItems(actor, ['x'])],
  ['add options', (actor) => createOptionGroup(actor, { name: 'X', min: 0, max: 1, options: [{ id: null, name: 'Y', kitchenName: '', allergens: [] }] })],
  ['change options', (actor) => updateOptionGroup(actor, { group: 'steak', version: 1, input: { name: 'X', min: 0, max: 1, options: [{ id: null, name: 'Y', kitchenName: '', allergens: [] }] } })],
  ['delete options', (actor) => deleteOptionGroup(actor, { group: 'steak', version: 1 })],
])('it is not for installers and trainers to %s', async (_, attempt) => {
  const before = await site();
  for (const role of ['installer', 'trainer'] as const) expect(await refused(attempt(as(role)))).toMatchObject({ code: 'not-allowed' });
  expect(await site()).toEqual(before);
});
