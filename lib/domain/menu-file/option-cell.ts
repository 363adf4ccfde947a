import { allergens, type Allergen } from '@/lib/domain/site/menu';
import { foldName } from './fold-name';

/**
 * The option groups of an item in one cell: groups split by "|", each "Name (min-max): option; option", each option
 * "Name = KITCHEN NAME {mustard, eggs}". A backslash before | ; : = { } ( ) or itself makes it an ordinary character.
 */
export type OptionText = { readonly name: string; readonly kitchenName: string; readonly allergens: readonly Allergen[] };
export type GroupText = { readonly name: string; readonly min: number; readonly max: number; readonly options: readonly OptionText[] };
export type GroupsReading = { readonly ok: true; readonly groups: readonly GroupText[] } | { readonly ok: false; readonly message: string };

const special = /[\\|;:={}()]/g;
const escape = (text: string): string => text.replace(special, (character) => `\\${character}`);

/** Splits at a character that no backslash guards; the pieces keep their backslashes. */
const splitAt = (text: string, separator: string): readonly string[] => {
  const pieces: string[] = [''];
  for (let index = 0; index < text.length; index += 1) {
    const character = text.charAt(index);
    if (character === '\\') {
      pieces[pieces.length - 1] += text.slice(index, index + 2);
      index += 1;
    } else if (character === separator) pieces.push('');
    else pieces[pieces.length - 1] += character;
  }
  return pieces;
};

/** As many characters, and as many choices, as a menu takes. */
const longestName = 120;
const mostChoices = 50;
const unreadable = /[\u0000-\u001f\u007f]/;

const unescape = (text: string): string => text.trim().replace(/\\(.)/gs, '$1');

/** Allergen names as the menu knows them; the rest is said. */
export const readAllergens = (text: string): { readonly known: readonly Allergen[]; readonly unknown: readonly string[] } => {
  const said = text.split(/[,;/]/).map((word) => word.trim().toLowerCase()).filter((word) => word !== '');
  const known = allergens.filter((allergen) => said.includes(allergen));
  return { known, unknown: said.filter((word) => !(allergens as readonly string[]).includes(word)) };
};

const readOption = (text: string): OptionText | string => {
  const braces = /^((?:\\.|[^\\{}])*)(?:\{((?:\\.|[^\\{}])*)\})?\s*$/s.exec(text);
  if (braces === null) return `The option “${text.trim()}” has a bracket that is not closed.`;
  const [name = '', kitchenName = '', ...more] = splitAt(braces[1] ?? '', '=').map(unescape);
  if (name === '' || more.length > 0) return `The option “${text.trim()}” has no name, or more than one “=”.`;
  if (name.length > longestName || kitchenName.length > longestName) return `The option “${name.slice(0, 40)}…” has more than ${longestName} characters.`;
  const { known, unknown } = readAllergens(unescape(braces[2] ?? ''));
  return unknown.length > 0 ? `“${unknown.join(', ')}” is no allergen of the list.` : { name, kitchenName, allergens: known };
};

const readGroup = (text: string): GroupText | string => {
  const [head = '', ...rest] = splitAt(text, ':');
  if (rest.length !== 1) return `The group “${text.trim()}” needs one “:” between its name and its options.`;
  const limits = /^((?:\\.|[^\\()])*)(?:\((\d{1,2})\s*-\s*(\d{1,2})\))?\s*$/s.exec(head);
  if (limits === null) return `The group “${head.trim()}” says how many may be chosen like this: (0-1).`;
  const name = unescape(limits[1] ?? '');
  const min = Number(limits[2] ?? 0);
  const max = Number(limits[3] ?? 1);
  if (name === '') return 'A group of options has no name.';
  if (name.length > longestName) return `The group “${name.slice(0, 40)}…” has more than ${longestName} characters.`;
  if (max > mostChoices) return `The group “${name}” lets ${max} be chosen; at most ${mostChoices} can be.`;
  if (max < 1 || max < min) return `The group “${name}” asks for at least ${min} and at most ${max}, which nobody can choose.`;
  const options = splitAt(rest[0] ?? '', ';').filter((option) => option.trim() !== '').map(readOption);
  const fault = options.find((option) => typeof option === 'string');
  if (fault !== undefined) return fault;
  const known = options.filter((option) => typeof option !== 'string');
  if (known.length === 0) return `The group “${name}” has no options.`;
  const twice = twiceIn(known.map((option) => option.name));
  return twice === undefined ? { name, min, max, options: known } : `The group “${name}” has the option “${twice}” twice.`;
};

const twiceIn = (names: readonly string[]): string | undefined => names.find((name, index) => names.findIndex((other) => foldName(other) === foldName(name)) < index);

export const readGroups = (cell: string): GroupsReading => {
  if (cell.trim() === '') return { ok: true, groups: [] };
  if (unreadable.test(cell)) return { ok: false, message: 'The options have a line break or another control character in them.' };
  const groups = splitAt(cell, '|').map(readGroup);
  const fault = groups.find((group) => typeof group === 'string');
  if (fault !== undefined) return { ok: false, message: fault };
  const known = groups.filter((group) => typeof group !== 'string');
  const twice = twiceIn(known.map((group) => group.name));
  return twice === undefined ? { ok: true, groups: known } : { ok: false, message: `The group “${twice}” stands twice.` };
};

const writeOption = ({ name, kitchenName, allergens: said }: OptionText): string =>
  [escape(name), kitchenName === '' ? '' : ` = ${escape(kitchenName)}`, said.length === 0 ? '' : ` {${said.join(', ')}}`].join('');

export const writeGroups = (groups: readonly GroupText[]): string =>
  groups.map(({ name, min, max, options }) => `${escape(name)} (${min}-${max}): ${options.map(writeOption).join('; ')}`).join(' | ');
