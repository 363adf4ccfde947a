import type { DishRow, SectionRows } from '../../build-menu';

const pasta: readonly DishRow[] = [
  ['Spaghetti pomodoro', 'Pomodoro', 'gluten', 540],
  ['Spaghetti carbonara', 'Carbonara', 'gluten eggs milk', 600],
  ['Cacio e pepe', '', 'gluten milk', 540],
  ['Bucatini, tomato and guanciale', 'Bucatini', 'gluten milk sulphites', 600],
  ['Tagliatelle, beef ragù', 'Tagl ragù', 'gluten eggs milk celery', 540],
  ['Lasagne', '', 'gluten eggs milk celery', 900],
  ['Linguine, clams', 'Ling clams', 'gluten molluscs sulphites', 660],
  ['Linguine, crab and chilli', 'Ling crab', 'gluten crustaceans', 600],
  ['Orecchiette, broccoli', 'Orecchiette', 'gluten fish', 540],
  ['Gnocchi, sage butter', 'Gnocchi', 'gluten eggs milk', 480],
  ['Pumpkin ravioli', 'Pump ravioli', 'gluten eggs milk nuts', 480],
  ['Pappardelle, mushrooms', 'Papp mushroom', 'gluten eggs milk', 600],
  ['Penne, tomato and chilli', 'Penne chilli', 'gluten', 540],
];

const fish: readonly DishRow[] = [
  ['Hake, brown butter', 'Hake brn butter', 'fish milk', 720],
  ['Sea bass, fennel', 'Sea bass', 'fish', 660],
  ['Salmon, sorrel', 'Salmon', 'fish milk sulphites', 600],
  ['Cod, chorizo and beans', 'Cod chorizo', 'fish sulphites', 720],
  ['Plaice meunière', 'Plaice', 'fish gluten milk', 600],
  ['Monkfish curry', 'Monk curry', 'fish milk mustard', 780],
  ['Moules marinière', 'Moules', 'molluscs milk celery sulphites', 540],
  ['Fish pie', '', 'fish crustaceans milk gluten eggs', 960],
  ['Battered haddock, tartare sauce', 'Haddock', 'fish gluten eggs mustard', 540],
  ['Grilled sardines', 'Sardines', 'fish', 480],
];

const sides: readonly DishRow[] = [
  ['Fries', '', '', 240],
  ['Triple-cooked chips', 'Triple chips', '', 300],
  ['Mashed potato', 'Mash', 'milk', 120],
  ['New potatoes', 'New pots', 'milk', 180],
  ['Gratin dauphinois', 'Gratin', 'milk', 240],
  ['Buttered greens', 'Greens', 'milk', 180],
  ['Creamed spinach', 'Spinach', 'milk', 180],
  ['Glazed carrots', 'Carrots', 'milk', 180],
  ['Cauliflower cheese', 'Cauli cheese', 'milk gluten mustard', 300],
  ['Onion rings', '', 'gluten', 240],
  ['Sautéed mushrooms', 'Mushrooms', 'milk', 240],
  ['Roast tomatoes', 'Tomatoes', '', 240],
  ['Fried eggs', '', 'eggs', 180],
  ['Streaky bacon', 'Bacon', 'sulphites', 240],
  ['Sourdough and butter', 'Sourdough', 'gluten milk', 90],
];

const lateMenu: readonly DishRow[] = [
  ['Cheese toastie', '', 'gluten milk mustard', 360],
  ['Fish finger sandwich', 'Fish finger', 'fish gluten eggs mustard', 420],
  ['Chips and curry sauce', 'Chips curry', 'mustard celery', 300],
  ['Chicken wings', 'Wings', 'celery milk', 600],
  ['Nachos', '', 'milk', 300],
  ['Potato skins, soured cream', 'Potato skins', 'milk', 480],
];

export const hotSections: readonly SectionRows[] = [
  { name: 'Pasta', course: 'Mains', dishes: pasta },
  { name: 'Fish', course: 'Mains', dishes: fish },
  { name: 'Sides', course: 'Mains', dishes: sides },
];

export const lateSection: SectionRows = { name: 'Late menu', course: 'Mains', dishes: lateMenu };
