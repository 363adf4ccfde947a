/**
 * Characters that make a spreadsheet read a cell as a formula: the OWASP page on CSV injection (= + - @ TAB CR LF) together
 * with ASVS 5.0 1.2.10 (which adds NUL).
 */
const leads = ['=', '+', '-', '@', '\t', '\r', '\n', '\0'];

const isRisky = (cell: string): boolean => leads.includes(cell.charAt(0));

/** Puts a quote before what a spreadsheet would run; a quote that is already there is doubled, so that it comes back. */
export const makeSafe = (cell: string): string => (isRisky(cell) || cell.startsWith("'") ? `'${cell}` : cell);

/** Takes that quote off again. A quote before anything else was the person's own. */
export const restore = (cell: string): string => (cell.startsWith("'") && (isRisky(cell.slice(1)) || cell.startsWith("''")) ? cell.slice(1) : cell);
