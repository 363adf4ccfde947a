import type { Station } from '@/lib/domain/site/station';

/** A code has two capital letters, and each differs from the letter in that place of every other station's. */
export const isCode = (code: string): boolean => /^[A-Z]{2}$/.test(code);

/** The station that a code could be taken for, and at which letter; null when it is free. */
export const codeClash = (code: string, others: readonly Pick<Station, 'name' | 'code'>[]): { readonly name: string; readonly letter: 1 | 2 } | null => {
  for (const { name, code: taken } of others) {
    if (code[0] === taken[0]) return { name, letter: 1 };
    if (code[1] === taken[1]) return { name, letter: 2 };
  }
  return null;
};

const alphabet = [...'ABCDEFGHIJKLMNOPQRSTUVWXYZ'];

/** A free code that a cook reads out of the name; null when no letter is left, which takes more than 26 stations. */
export const suggestCode = (name: string, others: readonly Pick<Station, 'name' | 'code'>[]): string | null => {
  const letters = [...name.normalize('NFD').toUpperCase()].filter((letter) => /[A-Z]/.test(letter));
  const free = (first: string, second: string): boolean => codeClash(first + second, others) === null;
  for (const [place, first] of letters.entries()) {
    const second = letters.slice(place + 1).find((letter) => free(first, letter));
    if (second !== undefined) return first + second;
  }
  for (const first of [...letters, ...alphabet]) {
    const second = alphabet.find((letter) => free(first, letter));
    if (second !== undefined) return first + second;
  }
  return null;
};
