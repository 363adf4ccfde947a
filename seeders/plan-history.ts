import { applyEdit } from '@/lib/domain/plans/apply-edit';
import { boardSiteOf } from '@/lib/domain/plans/board-site';
import { describeEdit } from '@/lib/domain/plans/describe-edit';
import type { PlanEdit } from '@/lib/domain/plans/edit';
import { asId } from '@/lib/domain/site/ids';
import { anyCondition, type Conditions, type PlanContent } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { slug } from './slug';

export type PlanVersion = { readonly number: number; readonly content: PlanContent; readonly summary: string };

/** "From the grill, Burgers" to "Grill", as a person would send them on the board. */
export const send = (sections: readonly string[], station: string, conditions: Conditions = anyCondition): PlanEdit => ({
  kind: 'send', targets: sections.map((section) => ({ kind: 'section', section: asId(slug(section)) })), conditions, how: 'replace', stations: [asId(slug(station))],
});

export const sendItem = (item: string, station: string): PlanEdit => ({
  kind: 'send', targets: [{ kind: 'item', item: asId(slug(item)) }], conditions: anyCondition, how: 'replace', stations: [asId(slug(station))],
});

export const copyEverything = (station: string): PlanEdit => ({ kind: 'copy', targets: [{ kind: 'everything' }], conditions: anyCondition, how: 'add', stations: [asId(slug(station))] });

export const splitOption = (option: string, station: string): PlanEdit => ({
  kind: 'split', target: { kind: 'option', option: asId(option) }, conditions: anyCondition, stations: [asId(slug(station))], keep: false,
});

type BoardOf = Pick<Site, 'menu' | 'areas' | 'tills' | 'stations'>;

export const offer = (site: BoardOf, section: string): PlanEdit => ({ kind: 'offer', sections: [asId(slug(section))], offered: true, all: site.menu.sections.map(({ id }) => id) });

/** The versions of a plan that begins with these sections and no rules, and takes one edit after the other. */
export const versionsOf = (site: BoardOf, plan: string, offers: readonly string[] | null, edits: readonly PlanEdit[]): readonly PlanVersion[] => {
  const board = boardSiteOf(site as Site);
  let rule = 0;
  const newId = () => asId<never>(`${slug(plan)}-${(rule += 1)}`);
  const offered = offers === null ? null : site.menu.sections.filter(({ name }) => offers.includes(name)).map(({ id }) => id);
  const first: PlanVersion = { number: 1, content: { offers: offered, rules: [] }, summary: 'Plan made' };
  return edits.reduce<readonly PlanVersion[]>((versions, edit) => {
    const content = versions.at(-1)?.content ?? first.content;
    return [...versions, { number: versions.length + 1, content: applyEdit(content, edit, newId), summary: describeEdit(edit, board, content) }];
  }, [first]);
};
