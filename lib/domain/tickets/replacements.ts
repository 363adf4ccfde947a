/** What prints in place of a character that a printer does not have, where leaving out the accent is not enough. */
const written: Readonly<Record<string, string>> = {
  '‘': "'", '’': "'", '‚': "'", '‛': "'", '′': "'", '“': '"', '”': '"', '„': '"', '″': '"', '«': '"', '»': '"', '‹': "'", '›': "'",
  '‐': '-', '‑': '-', '–': '-', '—': '-', '―': '-', '−': '-', '…': '...', '•': '*', '·': '.', '¡': '!', '¿': '?', '×': 'x', '÷': '/',
  '€': 'EUR', '£': 'GBP', '¥': 'JPY', '₽': 'RUB', '¢': 'c', '©': '(c)', '®': '(R)', '™': 'TM', '№': 'No', '°': 'deg', 'µ': 'u',
  '½': '1/2', '¼': '1/4', '¾': '3/4', '⅓': '1/3', '⅔': '2/3', '⅛': '1/8', '¹': '1', '²': '2', '³': '3',
  'ß': 'ss', 'ẞ': 'SS', 'æ': 'ae', 'Æ': 'AE', 'œ': 'oe', 'Œ': 'OE', 'ø': 'o', 'Ø': 'O', 'ł': 'l', 'Ł': 'L', 'đ': 'd', 'Đ': 'D',
  'ð': 'd', 'Ð': 'D', 'þ': 'th', 'Þ': 'TH', 'ħ': 'h', 'Ħ': 'H', 'ı': 'i', 'ŋ': 'ng', 'Ŋ': 'NG', 'ﬁ': 'fi', 'ﬂ': 'fl',
};

const cyrillic = 'абвгдежзийклмнопрстуфхцчшщъыьэюяёєії';
const cyrillicLatin = 'a b v g d e zh z i i k l m n o p r s t u f kh ts ch sh shch . y . e yu ya e ye i yi'.split(' ');
const greek = 'αβγδεζηθικλμνξοπρσςτυφχψω';
const greekLatin = 'a v g d e z i th i k l m n x o p r s s t y f ch ps o'.split(' ');

const pairs = (letters: string, latin: readonly string[]): readonly (readonly [string, string])[] =>
  Array.from(letters, (letter, index) => [letter, (latin[index] ?? '?').replace('.', '')] as const);

const table: ReadonlyMap<string, string> = new Map([
  ...Object.entries(written),
  ...[...pairs(cyrillic, cyrillicLatin), ...pairs(greek, greekLatin)].flatMap(([letter, latin]) => [
    [letter, latin] as const,
    ...(letter.toUpperCase() === letter ? [] : [[letter.toUpperCase(), latin.toUpperCase()] as const]),
  ]),
]);

export const unknownMark = '?';

const asciiOnly = /^[\x20-\x7e]*$/;

const withoutAccents = (grapheme: string): string => grapheme.normalize('NFD').replace(/\p{M}+/gu, '');

/** ASCII for one grapheme: by the table, else without its accents, else a question mark. */
export const replacementOf = (grapheme: string): string => {
  const listed = table.get(grapheme);
  if (listed !== undefined) return listed;
  const bare = withoutAccents(grapheme);
  if (bare !== '' && asciiOnly.test(bare)) return bare;
  return table.get(bare) ?? unknownMark;
};
