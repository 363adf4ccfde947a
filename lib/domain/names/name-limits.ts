/** What no site's policy can allow: the stops, as tables. */

/** Printer names on Windows shares longer than this make some calls fail (Microsoft KB 2444599: fewer than 31 characters with the path). */
export const longestNameBytes = 31;

/**
 * Characters that Windows refuses in a printer or share name ([MS-RPRN] 2.2.4.14: comma and backslash;
 * [MS-FSCC] 2.1.6: the rest) and those that CUPS refuses (lpadmin(8): / and #; systemv/lpadmin.c: \ ? ' and ").
 */
export const refusedCharacters: ReadonlyMap<string, string> = new Map([
  ['"', 'Windows and CUPS refuse it'], ['\\', 'Windows and CUPS refuse it'], ['/', 'Windows and CUPS refuse it'], ['?', 'Windows and CUPS refuse it'],
  [',', 'Windows refuses it'], ['[', 'Windows refuses it'], [']', 'Windows refuses it'], [':', 'Windows refuses it'], ['|', 'Windows refuses it'],
  ['<', 'Windows refuses it'], ['>', 'Windows refuses it'], ['+', 'Windows refuses it'], ['=', 'Windows refuses it'], [';', 'Windows refuses it'],
  ['*', 'Windows refuses it'],
  ['#', 'CUPS refuses it'], ["'", 'CUPS refuses it'],
]);

/** Names that Windows keeps for its own devices, with or without something after a dot. */
export const reservedNames: ReadonlySet<string> = new Set([
  'CON', 'PRN', 'AUX', 'NUL',
  ...Array.from({ length: 9 }, (_, index) => `COM${index + 1}`),
  ...Array.from({ length: 9 }, (_, index) => `LPT${index + 1}`),
]);

export const isReservedName = (name: string): boolean => reservedNames.has((name.split('.')[0] ?? '').toUpperCase());

export const whiteSpace = /[\s\u0085\u180e\u2800\u3164\uffa0]/u;

/** Control, format, private and unassigned characters, and all that a screen draws as nothing (Unicode Default_Ignorable_Code_Point). */
export const invisible = /[\p{C}\p{Default_Ignorable_Code_Point}]/u;

export const nonAscii = /[^\u0000-\u007f]/u;

const encoder = new TextEncoder();

/** Length in UTF-8, the unit in which print systems count. */
export const nameBytes = (name: string): number => encoder.encode(name).length;

/** Two names that a print system takes for one: compared in one composition and without case. */
export const foldName = (name: string): string => name.normalize('NFC').toLowerCase();

const lookAlikes: ReadonlyMap<string, string> = new Map([['O', '0'], ['l', '1'], ['I', '1']]);

/** What a name looks like on a small screen: O as 0, l and I as 1, read before case is folded. */
export const lookOf = (name: string): string => [...name].map((character) => lookAlikes.get(character) ?? character).join('');
