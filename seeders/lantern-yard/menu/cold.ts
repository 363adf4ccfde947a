import type { DishRow, SectionRows } from '../../build-menu';

const salads: readonly DishRow[] = [
  ['Beetroot salad', '', 'nuts milk mustard', 180],
  ['Caesar salad', 'Caesar', 'gluten eggs fish milk mustard', 180],
  ['Chicken Caesar', 'Chick Caesar', 'gluten eggs fish milk mustard', 240],
  ['Salade niçoise', 'Niçoise', 'eggs fish mustard', 240],
  ['Greek salad', '', 'milk', 180],
  ['Tomato and mozzarella', 'Tomato mozz', 'milk', 150],
  ['Waldorf salad', 'Waldorf', 'nuts celery eggs mustard', 180],
  ['Green salad', '', 'mustard', 120],
  ['Panzanella', '', 'gluten sulphites', 180],
  ['Lentil and feta', 'Lentil feta', 'milk mustard', 180],
  ['Crab and avocado', 'Crab avo', 'crustaceans eggs mustard', 210],
];

const coldStarters: readonly DishRow[] = [
  ['Crab toast', '', 'crustaceans gluten eggs mustard', 180],
  ['Gravadlax, dill', 'Gravadlax', 'fish mustard', 150],
  ['Beef carpaccio', 'Carpaccio', 'milk mustard', 180],
  ['Steak tartare', 'Tartare', 'eggs mustard fish gluten', 300],
  ['Chicken liver pâté', 'Liver pâté', 'milk gluten sulphites', 150],
  ['Ham hock terrine', 'Terrine', 'gluten mustard celery', 150],
  ['Burrata, peach', 'Burrata', 'milk', 150],
  ['Gazpacho', '', 'gluten celery sulphites', 90],
  ['Prawn cocktail', '', 'crustaceans eggs mustard fish', 180],
  ['Smoked mackerel, horseradish', 'Smk mackerel', 'fish milk mustard', 150],
  ['Cold veal, tuna sauce', 'Cold veal', 'fish eggs celery', 180],
  ['Crudités, aïoli', 'Crudités', 'eggs celery mustard', 150],
];

const oysters: readonly DishRow[] = [
  ['Rock oysters, six', 'Rock oyst 6', 'molluscs sulphites', 300],
  ['Rock oysters, twelve', 'Rock oyst 12', 'molluscs sulphites', 540],
  ['Native oysters, six', 'Native oyst 6', 'molluscs sulphites', 300],
  ['Oysters, cucumber and dill', 'Oyst cucumber', 'molluscs milk', 360],
];

export const coldSections: readonly SectionRows[] = [
  { name: 'Salads', course: 'Starters', dishes: salads },
  { name: 'Cold starters', course: 'Starters', dishes: coldStarters },
];

export const oysterSection: SectionRows = { name: 'Oysters', course: 'Starters', dishes: oysters };
