import { Tag } from '@/components/tag';
import type { MenuView } from '../menu-view';
import styles from './menu.module.css';

/** The items as a plain table: what is read without scripts, and by those who do not change the menu. */
export function ItemsStatic({ view }: { readonly view: MenuView }) {
  const courses = new Map(view.courses.map((course) => [course.id, course.name]));
  const groups = new Map(view.groups.map((group) => [group.id, group.name]));
  return (
    <div className={styles['scroll']} tabIndex={0} role="region" aria-label="Items">
      <table className={styles['table']}>
        <thead><tr><th scope="col">Item</th><th scope="col">Kitchen name</th><th scope="col">Course</th><th scope="col">Allergens</th><th scope="col">Options</th><th scope="col">State</th></tr></thead>
        <tbody>
          {view.items.map((item) => (
            <tr key={item.id}>
              <th scope="row">{item.name}</th>
              <td className="font-mono text-[13px]">{item.kitchenName}</td>
              <td>{item.course === null ? '' : courses.get(item.course)}</td>
              <td>{item.allergens.join(', ')}</td>
              <td>{item.optionGroups.map((group) => groups.get(group)).join(', ')}</td>
              <td>{item.soldOut ? <Tag tone="look">Sold out</Tag> : item.left === null ? '' : `${item.left} left`}{item.noTicket ? <Tag>No ticket</Tag> : null}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
