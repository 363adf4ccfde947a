/**
 * What makes two names one: without case, width and characters that cannot be seen; accents count, Crème is not Creme. The
 * tables compare names in the same way (UCA, accent sensitive and case insensitive).
 */
export const foldName = (text: string): string =>
  text.normalize('NFKC').replace(/\p{Default_Ignorable_Code_Point}/gu, '').toLowerCase().replaceAll('ß', 'ss').normalize('NFC').trim();
