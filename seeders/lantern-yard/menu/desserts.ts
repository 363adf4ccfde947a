import type { DishRow, SectionRows } from '../../build-menu';

const desserts: readonly DishRow[] = [
  ['Crème brûlée', '', 'eggs milk', 180],
  ['Sticky toffee pudding', 'Sticky toffee', 'gluten eggs milk', 240],
  ['Chocolate fondant', 'Fondant', 'gluten eggs milk soybeans', 720],
  ['Lemon tart', '', 'gluten eggs milk', 120],
  ['Apple crumble', 'Crumble', 'gluten milk', 300],
  ['Panna cotta, rhubarb', 'Panna cotta', 'milk', 120],
  ['Tiramisù', '', 'gluten eggs milk', 90],
  ['Cheesecake, blackcurrant', 'Cheesecake', 'gluten eggs milk', 90],
  ['Pavlova', '', 'eggs milk', 180],
  ['Bakewell tart', 'Bakewell', 'gluten eggs milk nuts', 120],
  ['Profiteroles', '', 'gluten eggs milk soybeans', 240],
  ['Affogato', '', 'milk', 90],
  ['Poached pear, hazelnut', 'Pear', 'nuts sulphites', 150],
  ['Sorbet, three scoops', 'Sorbet 3', '', 90],
  ['Ice cream, three scoops', 'Ice cream 3', 'milk eggs', 90],
  ['Cheese board', '', 'milk gluten celery nuts', 240],
];

export const dessertSection: SectionRows = { name: 'Desserts', course: 'Desserts', dishes: desserts };
