import type { SectionId } from '../site/ids';
import type { Target } from '../site/plan';
import type { BoardSite } from './board-site';

/** What a `send` rule can be about. */
export type SendTarget = Extract<Target, { readonly kind: 'everything' | 'section' | 'item' }>;
/** What a `split` rule can be about. */
export type SplitTarget = Extract<Target, { readonly kind: 'option' | 'option-on-section' | 'option-on-item' }>;
/** What a `copy` rule can be about. */
export type CopyTarget = SendTarget | Extract<Target, { readonly kind: 'option' }>;

/** Two targets are the same when their keys are. */
export const targetKey = (target: Target): string => {
  switch (target.kind) {
    case 'everything': return 'everything';
    case 'section': return `section:${target.section}`;
    case 'item': return `item:${target.item}`;
    case 'option': return `option:${target.option}`;
    case 'option-on-section': return `option:${target.option}|section:${target.section}`;
    case 'option-on-item': return `option:${target.option}|item:${target.item}`;
  }
};

const nameIn = (list: readonly { readonly id: string; readonly name: string }[], id: string): string | undefined =>
  list.find((candidate) => candidate.id === id)?.name;

/** "Burgers", "House burger", "side salad with Burgers"; a target that has gone says so. */
export const sayTarget = (target: Target, site: BoardSite): string => {
  const { sections, items, options } = site.menu;
  switch (target.kind) {
    case 'everything': return 'Everything';
    case 'section': return nameIn(sections, target.section) ?? 'a menu section that has gone';
    case 'item': return nameIn(items, target.item) ?? 'an item that has gone';
    case 'option': return nameIn(options, target.option) ?? 'an option that has gone';
    case 'option-on-section':
      return `${nameIn(options, target.option) ?? 'an option that has gone'} with ${nameIn(sections, target.section) ?? 'a menu section that has gone'}`;
    case 'option-on-item':
      return `${nameIn(options, target.option) ?? 'an option that has gone'} with ${nameIn(items, target.item) ?? 'an item that has gone'}`;
  }
};

export const sectionTarget = (section: SectionId): SendTarget => ({ kind: 'section', section });
