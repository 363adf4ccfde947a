import type { CodePage } from '@/lib/domain/site/printer';
import { graphemesOf } from './cells';
import { isInCodePage } from './code-pages';
import { replacementOf } from './replacements';

/** A character that a printer does not have, and what comes out instead. */
export type Replaced = { readonly character: string; readonly replacement: string };

export type Printable = { readonly text: string; readonly replaced: readonly Replaced[] };

export type LetterCase = 'capitals' | 'as typed';

const spaces = /[\p{Zs}\t\n\v\f\r\u0085\u2028\u2029]+/gu;
/** Control characters and halves of surrogate pairs; also invisible ones, but for the joiners inside one grapheme. */
const unseen = /[\p{Cc}\p{Cs}]|(?![\u200c\u200d])\p{Cf}/gu;
const joiners = /[\u200c\u200d\ufe00-\ufe0f]/gu;

/** One space where there was any white space, nothing that a printer could take for a command, accents composed (NFC). */
export const cleanText = (text: string): string => text.replace(spaces, ' ').replace(unseen, '').normalize('NFC').trim();

/** The first form that the page has: capital, else as typed (CP437 has è but no È), else its replacement. */
const printGrapheme = (grapheme: string, letterCase: LetterCase, codePage: CodePage): { readonly text: string; readonly whole: boolean } => {
  const bare = grapheme.replace(joiners, '');
  const capital = letterCase === 'capitals' ? bare.toUpperCase() : bare;
  if (isInCodePage(capital, codePage)) return { text: capital, whole: true };
  if (isInCodePage(bare, codePage)) return { text: bare, whole: true };
  return { text: replacementOf(capital), whole: false };
};

/** Text as one printer can print it, in its code page only, and every character that had to be replaced, once each. */
export const printable = (typed: string, codePage: CodePage, letterCase: LetterCase): Printable => {
  const text: string[] = [];
  const replaced = new Map<string, string>();
  for (const grapheme of graphemesOf(cleanText(typed))) {
    const printed = printGrapheme(grapheme, letterCase, codePage);
    text.push(printed.text);
    if (!printed.whole) replaced.set(grapheme, printed.text);
  }
  return {
    text: text.join('').replace(/ +/g, ' ').trim(),
    replaced: Array.from(replaced, ([character, replacement]) => ({ character, replacement })),
  };
};
