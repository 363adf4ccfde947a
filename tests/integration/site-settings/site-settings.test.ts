import { beforeEach, describe, expect, it } from 'vitest';
import { partOf } from '@/features/site-settings/facts';
import { partOrder } from '@/features/site-settings/parts';
import { partSchemas, type Part, type Values } from '@/features/site-settings/schema';
import { savePart } from '@/features/site-settings/server/save-part';
import type { Role } from '@/lib/domain/roles/permissions';
import type { Site } from '@/lib/domain/site/site';
import type { Actor } from '@/lib/server/actor';
import { lastChangeOf } from '@/lib/server/history';
import { loadSite } from '@/lib/server/site-snapshot';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const siteId = 'lantern-yard';
const as = (role: Role): Actor => ({ person: { id: 'marguerite-adeyemi', name: 'Marguerite Adeyemi', email: '' }, membership: { role, mayOverride: true, title: '' }, siteId });
const owner = as('owner');

const site = async (id = siteId): Promise<Site> => {
  const loaded = await loadSite(id);
  if (loaded === null) throw new Error(`The demo has no ${id}.`);
  return loaded;
};
const save = async <Of extends Part>(part: Of, change: (values: Values<Of>) => Values<Of>, actor = owner): Promise<{ readonly version: number }> => {
  const before = await site();
  return savePart(actor, part, { version: before.version, values: change(partOf(part, before)) });
};
const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'done', (error: unknown) => error);
const fieldError = (field: string) => ({ name: 'AppError', code: 'invalid', details: { fields: expect.arrayContaining([expect.objectContaining({ field })]) } });

describe('every part of a site', () => {
  it.each(partOrder)('is saved as it was without changing anything: %s', async (part) => {
    const before = await site();
    expect(partSchemas[part].parse(partOf(part, before))).toEqual(partOf(part, before));
    await save(part, (values) => values);
    expect({ ...(await site()), version: before.version }).toEqual(before);
  });

  it('is on its site alone', async () => {
    const before = await site('pilgrims-oven');
    for (const part of partOrder) await save(part, (values) => values);
    await save('courses', ({ courses }) => ({ courses: [...courses, { id: '', name: 'Food' }] }));
    expect(await site('pilgrims-oven')).toEqual(before);
  });

  it.each<readonly [Role, readonly Part[]]>([
    ['owner', partOrder], ['installer', ['network', 'link', 'shared-points']], ['chef', []], ['trainer', []],
  ])('is for the %s to change as far as the role goes', async (role, may) => {
    for (const part of partOrder) {
      const answer = await refused(save(part, (values) => values, as(role)));
      expect([part, may.includes(part) ? 'done' : (answer as { code: string }).code]).toEqual([part, may.includes(part) ? answer : 'not-allowed']);
    }
  });

  it('is refused when another part was saved since, with who and what', async () => {
    const { version } = await site();
    await save('about', (values) => ({ ...values, place: 'Old harbour' }));
    const answer = await refused(savePart(owner, 'follow', { version, values: { follows: 'asking' } }));
    expect(answer).toMatchObject({ name: 'StaleWrite', lastChange: { by: 'Marguerite Adeyemi', summary: 'The site: place Old harbour' } });
    expect((await site()).follows).toBe('by-hand');
  });
});

describe('the site itself', () => {
  it('takes a name, a place, a zone and a language, and tells the history', async () => {
    await save('about', () => ({ name: 'Lantern Court', place: '', timeZone: 'Europe/Dublin', language: 'de-AT' }));
    expect(await site()).toMatchObject({ name: 'Lantern Court', place: '', timeZone: 'Europe/Dublin', language: 'de-AT', version: 2 });
    expect((await lastChangeOf(siteId, 'site', siteId))?.summary).toBe('The site: name Lantern Court, place Nobody has said, time zone Europe/Dublin, language Austrian German (de-AT)');
  });

  it.each(['Europe/Atlantis', '+01:00', 'UTC+1', '', 'Europe/Dublin; DROP'])('takes no zone that no clock knows: %j', (timeZone) => {
    expect(partSchemas.about.safeParse({ name: 'X', place: '', timeZone, language: 'en' }).success).toBe(false);
  });

  it.each(['english language', 'e', '', 'en_GB'])('takes no language tag that is none: %j', (language) => {
    expect(partSchemas.about.safeParse({ name: 'X', place: '', timeZone: 'UTC', language }).success).toBe(false);
  });
});

describe('the network', () => {
  it('is kept as it was found on site, for the checks to judge', async () => {
    const found = { subnet: '10.20.30.7/24', gateway: '10.20.1', poolFrom: '10.20.30.150', poolTo: '10.20.30.100', reserved: [{ address: '10.20.30.9', reason: 'Scales' }, { address: 'somewhere', reason: '' }] };
    await save('network', () => found);
    expect((await site()).network).toEqual(found);
  });

  it('reserves no address twice', async () => {
    const before = (await site()).network;
    const answer = await refused(save('network', (values) => ({ ...values, reserved: [...values.reserved, { address: before.reserved[0]?.address ?? '', reason: 'Again' }] })));
    expect(answer).toMatchObject(fieldError(`reserved.${before.reserved.length}.address`));
    expect((await site()).network).toEqual(before);
  });
});

describe('the print link', () => {
  it('runs on a till, on a device of its own, or nowhere, and keeps nothing of the other ways', async () => {
    await save('link', () => ({ kind: 'till', till: 'till-1', address: '10.20.30.50', mask: '255.255.255.0' }));
    expect((await site()).link).toEqual({ kind: 'till', till: 'till-1' });
    await save('link', () => ({ kind: 'own', till: 'till-1', address: '10.20.30.50', mask: '255.255.255.0' }));
    expect((await site()).link).toEqual({ kind: 'own', address: '10.20.30.50', mask: '255.255.255.0' });
    await save('link', () => ({ kind: 'none', till: 'till-1', address: '10.20.30.50', mask: '' }));
    expect(partOf('link', await site())).toEqual({ kind: 'none', till: '', address: '', mask: '' });
  });

  it.each(['', 'shop-counter', 'gone'])('does not run on a till that is not here: %j', async (till) => {
    expect(await refused(save('link', () => ({ kind: 'till', till, address: '', mask: '' })))).toMatchObject(fieldError('till'));
    expect((await site()).link.kind).toBe('none');
  });
});

describe('lists with names', () => {
  it('change order, swap names, lose and gain rows in one save, and what hangs on a row stays on it', async () => {
    const [first, second, ...rest] = (await site()).sharedPoints;
    if (first === undefined || second === undefined) throw new Error('The demo has no two shared points.');
    const hanging = async (id: string) => (await site()).printers.filter(({ sharedPoints }) => sharedPoints.some((point) => point === id)).map(({ name }) => name);
    const onFirst = await hanging(first.id);
    await save('shared-points', () => ({ points: [{ ...second, name: first.name }, { ...first, name: second.name }, { id: '', name: 'Rack in the office', kind: 'other' }] }));
    expect((await site()).sharedPoints).toEqual([{ ...second, name: first.name }, { ...first, name: second.name }, { id: expect.any(String), name: 'Rack in the office', kind: 'other' }]);
    expect([await hanging(first.id), await hanging(rest[0]?.id ?? '')]).toEqual([onFirst, []]);
  });

  it.each(['Kitchen switch', 'KITCHEN SWITCH', 'kitchen switch '])('hold no name twice: %j', async (name) => {
    const before = await site();
    const answer = await refused(savePart(owner, 'shared-points', { version: before.version, values: partSchemas['shared-points'].parse({ points: [...partOf('shared-points', before).points, { id: '', name, kind: 'switch' }] }) }));
    expect(answer).toMatchObject(fieldError(`points.${before.sharedPoints.length}.name`));
    expect(await site()).toEqual(before);
  });

  it('take no row of another site', async () => {
    const foreign = (await site('pilgrims-oven')).sharedPoints[0];
    const answer = await refused(save('shared-points', ({ points }) => ({ points: [...points, { id: foreign?.id ?? '', name: 'Theirs', kind: 'switch' }] })));
    expect(answer).toMatchObject({ name: 'AppError', code: 'invalid' });
    expect((await site('pilgrims-oven')).sharedPoints[0]).toEqual(foreign);
  });

  it('lose no course that dishes are in, and say how many', async () => {
    const before = await site();
    const [drinks] = before.courses;
    const inIt = before.menu.items.filter(({ course }) => course === drinks?.id).length;
    const answer = await refused(save('courses', ({ courses }) => ({ courses: courses.slice(1) })));
    expect(answer).toMatchObject({ ...fieldError('courses'), message: expect.stringContaining(`${inIt} items are in Drinks.`) });
    expect(await site()).toEqual(before);
  });

  it('put courses in another order', async () => {
    await save('courses', ({ courses }) => ({ courses: courses.toReversed() }));
    expect((await site()).courses.map(({ name }) => name)).toEqual(['Desserts', 'Mains', 'Starters', 'Drinks']);
  });
});

describe('printer names', () => {
  it.each([[5, 4], [0, 12], [2, 32], [2.5, 12]])('are no shorter than %d and no longer than %d: refused', (minLength, maxLength) => {
    expect(partSchemas.names.safeParse({ minLength, maxLength, allowUnderscore: true, allowHyphen: true, mustStartWithLetter: true }).success).toBe(false);
  });

  it('follow what the site says', async () => {
    await save('names', () => ({ minLength: 3, maxLength: 8, allowUnderscore: false, allowHyphen: true, mustStartWithLetter: false }));
    expect((await site()).namingPolicy).toEqual({ minLength: 3, maxLength: 8, allowUnderscore: false, allowHyphen: true, mustStartWithLetter: false });
  });
});

describe('contacts', () => {
  it('are kept in their order', async () => {
    const contacts = [{ kind: 'electrician' as const, name: 'Oona Brisk', phone: '', email: '' }, { kind: 'network' as const, name: 'Fault desk', phone: '+44 1632 960200', email: 'faults@harbourfibre.example' }];
    await save('contacts', () => ({ contacts }));
    expect((await site()).contacts).toEqual(contacts);
  });

  it('have an address that a mail can be sent to, or none', () => {
    const withEmail = (email: string) => partSchemas.contacts.safeParse({ contacts: [{ kind: 'network', name: 'X', phone: '', email }] }).success;
    expect(['', 'faults@harbourfibre.example', 'faults'].map(withEmail)).toEqual([true, true, false]);
  });
});
