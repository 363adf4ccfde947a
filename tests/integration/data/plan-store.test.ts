import { beforeEach, describe, expect, it } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import type { PlanContent } from '@/lib/domain/site/plan';
import { inTransaction } from '@/lib/server/database';
import { lastChangeOf } from '@/lib/server/history';
import { readPlanVersion, writePlanContent } from '@/lib/server/plan-store';
import { loadSite } from '@/lib/server/site-snapshot';
import { StaleWrite } from '@/lib/server/versioned-update';
import { PlanVersionRow } from '@/models/plan-version';
import { RuleRow } from '@/models/rule';
import { SiteRow } from '@/models/site';
import { aRule } from '@/tests/fixtures/build-site';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const dinner = async () => {
  const plan = (await loadSite('lantern-yard'))?.plans.find(({ name }) => name === 'Dinner');
  if (plan === undefined) throw new Error('The demo has no Dinner.');
  return plan;
};

const write = (version: number, content: PlanContent, summary = 'Oysters to Larder') =>
  inTransaction((transaction) => writePlanContent(transaction, { siteId: 'lantern-yard', planId: 'dinner', version, content, summary, personId: 'ines-okafor' }));

const oysters = aRule('oysters-rule', 'send', { kind: 'section', section: asId('oysters') }, ['larder']);
const versionsKept = async () => (await PlanVersionRow.findAll({ where: { siteId: 'lantern-yard', planId: 'dinner' }, order: ['number'] })).map(({ number }) => number);

describe('an edit of a plan', () => {
  it('makes its next version, which is what the site then holds', async () => {
    const { version, offers, rules } = await dinner();
    const content = { offers, rules: [...rules, oysters] };
    expect(await write(version, content)).toEqual({ version: version + 1 });
    expect(await dinner()).toMatchObject({ ...content, version: version + 1 });
    expect(await readPlanVersion('lantern-yard', 'dinner', version + 1)).toEqual(content);
  });

  it('keeps every earlier version as it was', async () => {
    const { version, offers } = await dinner();
    const before = await readPlanVersion('lantern-yard', 'dinner', version);
    await write(version, { offers, rules: [oysters] });
    await write(version + 1, { offers: [], rules: [] }, 'Everything off');
    expect(await versionsKept()).toEqual(Array.from({ length: version + 2 }, (_, index) => index + 1));
    expect(await readPlanVersion('lantern-yard', 'dinner', version)).toEqual(before);
    expect(await readPlanVersion('lantern-yard', 'dinner', version + 1)).toEqual({ offers, rules: [oysters] });
    expect(await readPlanVersion('lantern-yard', 'dinner', version + 9)).toBeNull();
  });

  it('is one line of history and moves the revision of the site on', async () => {
    const { version, offers, rules } = await dinner();
    const revision = async () => (await SiteRow.findByPk('lantern-yard'))?.revision ?? 0;
    const before = await revision();
    await write(version, { offers, rules: [...rules, oysters] });
    expect(await revision()).toBe(before + 1);
    expect(await lastChangeOf('lantern-yard', 'plan', 'dinner')).toMatchObject({ by: 'Ines Okafor', summary: 'Dinner: Oysters to Larder' });
  });

  it('is refused when it was made from an older version, and changes nothing', async () => {
    const before = await dinner();
    await expect(write(before.version - 1, { offers: null, rules: [] })).rejects.toBeInstanceOf(StaleWrite);
    expect(await dinner()).toEqual(before);
    expect(await versionsKept()).toHaveLength(before.version);
  });

  it('is refused whole when one rule sends to a station of another site', async () => {
    const before = await dinner();
    const foreign = aRule('foreign', 'send', { kind: 'section', section: asId('oysters') }, ['oven']);
    await expect(write(before.version, { offers: before.offers, rules: [...before.rules, foreign] })).rejects.toThrow();
    expect(await dinner()).toEqual(before);
    expect(await RuleRow.count({ where: { siteId: 'lantern-yard', id: 'foreign' } })).toBe(0);
  });

  it('of many at once is taken from exactly one', async () => {
    const { version, offers, rules } = await dinner();
    const outcomes = await Promise.allSettled(Array.from({ length: 6 }, (_, index) => write(version, { offers, rules: [...rules, { ...oysters, id: asId(`oysters-${index}`) }] })));
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(outcomes.flatMap((one) => (one.status === 'rejected' && !(one.reason instanceof StaleWrite) ? [one.reason] : []))).toEqual([]);
    expect((await dinner()).rules).toHaveLength(rules.length + 1);
  });

  it('does not touch what is live', async () => {
    const live = (await loadSite('lantern-yard'))?.live;
    const { version } = await dinner();
    await write(version, { offers: null, rules: [] });
    expect((await loadSite('lantern-yard'))?.live).toEqual(live);
  });
});
