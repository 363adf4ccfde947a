import type { OptionId } from '@/lib/domain/site/ids';
import type { Item, Menu } from '@/lib/domain/site/menu';

/**
 * The option sets worth trying on an item: none, each option, and each pair of options that both have splits and
 * can be chosen together. Options resolve one by one, so that larger sets add nothing.
 */
export const optionSetsOf = (menu: Menu, splitOptions: ReadonlySet<OptionId>) => {
  const groups = new Map(menu.optionGroups.map((group) => [group.id, group]));
  return (item: Item): readonly (readonly OptionId[])[] => {
    if (item.optionGroups.length === 0) return [[]];
    const choices = item.optionGroups.flatMap((id) => {
      const group = groups.get(id);
      return group === undefined ? [] : group.options.map((option) => ({ option, group }));
    });
    const splitting = choices.filter(({ option }) => splitOptions.has(option));
    const pairs = splitting.flatMap((first, index) =>
      splitting.slice(index + 1)
        .filter((second) => first.option !== second.option && (first.group !== second.group || first.group.max >= 2))
        .map((second) => [first.option, second.option]));
    return [[], ...choices.map(({ option }) => [option]), ...pairs];
  };
};
