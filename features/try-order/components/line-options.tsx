'use client';

import { toggleOption } from '@/lib/domain/orders/edit-order';
import type { OrderLine } from '@/lib/domain/orders/order';
import type { OptionGroup } from '@/lib/domain/site/menu';
import type { Site } from '@/lib/domain/site/site';
import styles from './try-order.module.css';

const limitWords = ({ min, max }: OptionGroup): string => {
  if (min === max) return `choose ${min}`;
  return min === 0 ? `up to ${max}` : `${min} to ${max}`;
};

type OptionsProps = { readonly site: Site; readonly line: OrderLine; readonly index: number; readonly onChange: (change: Partial<OrderLine>) => void };

function Group({ site, line, index, group, onChange }: OptionsProps & { readonly group: OptionGroup }) {
  const one = group.min === 1 && group.max === 1;
  return (
    <fieldset className={styles['options']}>
      <legend>{group.name} <span>{limitWords(group)}</span></legend>
      {site.menu.options.filter(({ id }) => group.options.includes(id)).map(({ id, name }) => (
        <label key={id}>
          <input
            type={one ? 'radio' : 'checkbox'}
            name={`${index}-${group.id}`}
            checked={line.options.includes(id)}
            onChange={() => onChange({ options: toggleOption(line, group, id) })}
          />
          <span>{name}</span>
        </label>
      ))}
    </fieldset>
  );
}

export function LineOptions(props: OptionsProps) {
  const item = props.site.menu.items.find(({ id }) => id === props.line.item);
  const groups = (item?.optionGroups ?? []).flatMap((id) => props.site.menu.optionGroups.find((group) => group.id === id) ?? []);
  return groups.map((group) => <Group key={group.id} group={group} {...props} />);
}
