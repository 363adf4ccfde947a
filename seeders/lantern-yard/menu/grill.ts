import type { DishRow, SectionRows } from '../../build-menu';

const fromTheGrill: readonly DishRow[] = [
  ['Ribeye, 300 g', 'Ribeye 300', 'milk', 720, ['Steak']],
  ['Sirloin, 250 g', 'Sirloin 250', 'milk', 660, ['Steak']],
  ['Fillet, 200 g', 'Fillet 200', 'milk', 600, ['Steak']],
  ['Bavette, shallot butter', 'Bavette', 'milk sulphites', 480, ['Steak']],
  ['Côte de boeuf for two', 'Côte boeuf x2', 'milk', 1500],
  ['Half chicken, lemon and thyme', 'Half chicken', '', 1080],
  ['Poussin, chilli and lime', 'Poussin', '', 1200],
  ['Lamb cutlets, mint salsa', 'Lamb cutlets', 'sulphites', 540],
  ['Lamb kofta, flatbread', 'Kofta', 'gluten milk sesame', 600],
  ['Pork chop, apple and sage', 'Pork chop', 'sulphites', 840],
  ['Pork belly, padrón peppers', 'Pork belly', '', 900],
  ['Merguez, harissa', 'Merguez', 'sulphites celery', 480],
  ['Duck breast, cherry', 'Duck breast', 'sulphites', 780],
  ['Venison haunch, juniper', 'Venison', 'celery sulphites', 720],
  ['Mixed grill', '', 'gluten sulphites mustard', 960],
  ['Halloumi skewers', '', 'milk', 420],
  ['Grilled cauliflower, tahini', 'Cauli tahini', 'sesame', 660],
  ['Portobello, garlic crumb', 'Portobello', 'gluten milk', 540],
];

const burgers: readonly DishRow[] = [
  ['House burger', '', 'gluten eggs milk mustard sesame', 540, ['Burger', 'Burger side']],
  ['Cheese burger', '', 'gluten eggs milk mustard sesame', 540, ['Burger', 'Burger side']],
  ['Bacon burger', '', 'gluten eggs milk mustard sesame', 600, ['Burger', 'Burger side']],
  ['Blue cheese burger', 'Blue burger', 'gluten eggs milk mustard sesame', 560, ['Burger', 'Burger side']],
  ['Jalapeño burger', '', 'gluten eggs milk mustard sesame', 540, ['Burger', 'Burger side']],
  ['Lamb burger', '', 'gluten eggs milk sesame', 600, ['Burger', 'Burger side']],
  ['Chicken burger', '', 'gluten eggs milk sesame', 660, ['Burger side']],
  ['Halloumi burger', '', 'gluten eggs milk sesame', 420, ['Burger side']],
  ['Bean burger', '', 'gluten soybeans sesame', 480, ['Burger side']],
];

const sundayRoast: readonly DishRow[] = [
  ['Roast sirloin, Yorkshire pudding', 'Roast beef', 'gluten eggs milk celery', 300, ['Roast']],
  ['Roast chicken, bread sauce', 'Roast chicken', 'gluten milk celery', 300, ['Roast']],
  ['Roast pork, crackling', 'Roast pork', 'gluten celery', 300, ['Roast']],
  ['Leg of lamb, rosemary', 'Roast lamb', 'gluten celery sulphites', 300, ['Roast']],
  ['Gammon, mustard glaze', 'Gammon', 'gluten mustard celery', 300, ['Roast']],
  ['Nut roast', '', 'gluten nuts celery', 300, ['Roast']],
  ['Roast for the table', 'Roast table', 'gluten eggs milk celery', 480, ['Roast']],
];

export const grillSections: readonly SectionRows[] = [
  { name: 'From the grill', course: 'Mains', dishes: fromTheGrill },
  { name: 'Burgers', course: 'Mains', dishes: burgers },
  { name: 'Sunday roast', course: 'Mains', dishes: sundayRoast },
];
