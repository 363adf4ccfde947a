import type { Allergen } from '@/lib/domain/site/menu';

/** The fourteen of Regulation (EU) No 1169/2011, Annex II, as they are said at a table and printed on a ticket. */
export const allergyWords: Readonly<Record<Allergen, string>> = {
  gluten: 'Gluten', crustaceans: 'Crustaceans', eggs: 'Eggs', fish: 'Fish', peanuts: 'Peanuts', soybeans: 'Soya', milk: 'Milk', nuts: 'Tree nuts',
  celery: 'Celery', mustard: 'Mustard', sesame: 'Sesame', sulphites: 'Sulphites', lupin: 'Lupin', molluscs: 'Molluscs',
};

/** Words by which guests and waiters name each of the fourteen; whole words, lower case. */
const saidAs: Readonly<Record<Allergen, readonly string[]>> = {
  gluten: ['gluten', 'wheat', 'rye', 'barley', 'oats', 'spelt', 'coeliac', 'celiac'],
  crustaceans: ['crustacean', 'crustaceans', 'shellfish', 'crab', 'prawn', 'prawns', 'shrimp', 'lobster'],
  eggs: ['egg', 'eggs'],
  fish: ['fish'],
  peanuts: ['peanut', 'peanuts'],
  soybeans: ['soy', 'soya', 'soybean', 'soybeans'],
  milk: ['milk', 'dairy', 'lactose', 'cream', 'butter', 'cheese'],
  nuts: ['nut', 'nuts', 'tree nuts', 'almond', 'almonds', 'hazelnut', 'hazelnuts', 'walnut', 'walnuts', 'cashew', 'cashews', 'pecan', 'pecans', 'pistachio', 'pistachios', 'macadamia'],
  celery: ['celery', 'celeriac'],
  mustard: ['mustard'],
  sesame: ['sesame', 'tahini'],
  sulphites: ['sulphite', 'sulphites', 'sulfite', 'sulfites', 'sulphur'],
  lupin: ['lupin'],
  molluscs: ['mollusc', 'molluscs', 'shellfish', 'oyster', 'oysters', 'mussel', 'mussels', 'clam', 'clams', 'squid', 'octopus'],
};

const wholeWord = (word: string): RegExp => new RegExp(`(?<![\\p{L}])${word}(?![\\p{L}])`, 'iu');

const patterns = (Object.entries(saidAs) as [Allergen, readonly string[]][]).map(([allergen, words]) => [allergen, words.map(wholeWord)] as const);

/** Which of the fourteen some free words speak of; none when they speak of something else. */
export const allergensSaid = (words: string): readonly Allergen[] =>
  patterns.filter(([, wordPatterns]) => wordPatterns.some((pattern) => pattern.test(words))).map(([allergen]) => allergen);
