import { allergensSaid, allergyWords } from './allergy-words';

const speaksOfAllergy = /(?<!\p{L})(allerg|intoleran|anaphyla|coeliac|celiac|epipen)/iu;
const leavesOut = /(?<!\p{L})(no|without|free of|hold the|not any)(?!\p{L})|(?<=\p{L})-free(?!\p{L})/iu;

/**
 * The allergy that a note looks like, to be offered as one: "no walnuts" may be a taste or a danger, and only a person
 * can tell. Null when a note is about something else.
 */
export const allergyInNote = (note: string): string | null => {
  const said = allergensSaid(note);
  if (speaksOfAllergy.test(note)) return said.length === 0 ? note.trim() : said.map((allergen) => allergyWords[allergen]).join(', ');
  return leavesOut.test(note) && said.length > 0 ? said.map((allergen) => allergyWords[allergen]).join(', ') : null;
};
