/** "Grill", "Grill and Larder", "Grill, Larder and Sauce". */
export const listWords = (words: readonly string[]): string =>
  words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`;

/** Names while they can be taken in at a glance, else how many: "4 menu sections". */
export const listOrCount = (names: readonly string[], noun: string): string =>
  names.length <= 2 ? listWords(names) : `${names.length} ${noun}`;

/** "1 item", "18 items". */
export const countWords = (count: number, singular: string, plural = `${singular}s`): string =>
  count === 1 ? `1 ${singular}` : `${count} ${plural}`;

/** Whether a heading of a menu takes a plural verb: "Oysters print", "Late menu prints". */
export const readsAsPlural = (name: string): boolean => / and /i.test(name) || /[^s]s$/i.test(name.trim());

/** "side salad splits", "chips split"; of "chips with Burgers" the option decides. */
export const splitsVerb = (name: string): string => (readsAsPlural(name.split(' with ')[0] ?? name) ? 'split' : 'splits');

export const capitalise = (sentence: string): string => sentence.charAt(0).toUpperCase() + sentence.slice(1);
