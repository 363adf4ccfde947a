import stringWidth from 'string-width';

const segmenter = new Intl.Segmenter('en', { granularity: 'grapheme' });
const plain = /^[\x20-\x7e]*$/;

/** What a reader calls letters: extended grapheme clusters, Unicode Standard Annex 29. */
export const graphemesOf = (text: string): readonly string[] =>
  plain.test(text) ? text.split('') : Array.from(segmenter.segment(text), ({ segment }) => segment);

/** Width on paper and on screen, in cells of one letter; Unicode Standard Annex 11 gives wide characters two. */
export const cellsOf = (text: string): number => (plain.test(text) ? text.length : stringWidth(text));

export const padTo = (text: string, cells: number): string => text + ' '.repeat(Math.max(0, cells - cellsOf(text)));
