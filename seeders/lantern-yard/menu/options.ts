import type { GroupRows } from '../../build-menu';

/** On the 182 items these make 65 choices: 20 on steaks, 30 on burgers, 7 on roasts, 8 on hot drinks. */
export const optionGroups: readonly GroupRows[] = [
  { name: 'Steak', min: 1, max: 1, options: [['rare', ''], ['medium rare', ''], ['medium', ''], ['medium well', ''], ['well done', '']] },
  { name: 'Burger', min: 1, max: 1, options: [['medium', ''], ['well done', '']] },
  { name: 'Burger side', min: 0, max: 1, options: [['fries', ''], ['side salad', 'mustard']] },
  { name: 'Roast', min: 0, max: 1, options: [['extra gravy', 'gluten celery']] },
  { name: 'Milk', min: 0, max: 1, options: [['oat milk', 'gluten'], ['soya milk', 'soybeans']] },
];
