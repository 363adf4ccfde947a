import { buildMenu, type DishRow } from '../build-menu';

const bread: readonly DishRow[] = [
  ['Sourdough loaf', '', 'gluten', 30],
  ['Rye loaf', '', 'gluten', 30],
  ['Seeded bloomer', '', 'gluten sesame', 30],
  ['Baguette', '', 'gluten', 30],
  ['Focaccia, rosemary', 'Focaccia', 'gluten', 60],
];

const pastries: readonly DishRow[] = [
  ['Croissant', '', 'gluten milk eggs', 60],
  ['Pain au chocolat', '', 'gluten milk eggs soybeans', 60],
  ['Almond croissant', '', 'gluten milk eggs nuts', 60],
  ['Cinnamon bun', '', 'gluten milk eggs', 60],
  ['Éclair, coffee', 'Éclair', 'gluten milk eggs', 60],
  ['Cheese scone', '', 'gluten milk eggs', 90],
];

const hotFromTheOven: readonly DishRow[] = [
  ['Sausage roll', '', 'gluten eggs mustard', 120],
  ['Spinach börek', 'Börek', 'gluten milk eggs', 150],
  ['Quiche of the day', 'Quiche', 'gluten milk eggs', 180],
];

const sandwiches: readonly DishRow[] = [
  ['Ham and Gruyère', 'Ham Gruyère', 'gluten milk mustard', 150, ['Bread']],
  ['Egg and cress', '', 'gluten eggs mustard', 120, ['Bread']],
  ['Roast vegetables', 'Roast veg', 'gluten', 150, ['Bread']],
  ['Soup and bread', '', 'gluten celery milk', 120],
];

const drinks: readonly DishRow[] = [
  ['Espresso', '', '', 45],
  ['Flat white', '', 'milk', 75],
  ['Pot of tea', 'Tea', '', 60],
  ['Hot chocolate', '', 'milk', 90],
  ['Apple juice', '', '', 20],
];

/** 24 items, one of them on paper only: a voucher needs no ticket. */
export const menu = buildMenu(
  [
    { name: 'Bread', course: null, dishes: bread },
    { name: 'Pastries', course: null, dishes: pastries },
    { name: 'Hot from the oven', course: null, dishes: hotFromTheOven },
    { name: 'Sandwiches and soup', course: null, dishes: sandwiches },
    { name: 'Coffee and cold drinks', course: 'Drinks', dishes: drinks },
    { name: 'Gifts', course: null, dishes: [['Gift voucher', '', '', 0]] },
  ],
  [{ name: 'Bread', min: 1, max: 1, options: [['on sourdough', 'gluten'], ['on rye', 'gluten'], ['warmed through', '']] }],
  { 'Gift voucher': { noTicket: true } },
);
