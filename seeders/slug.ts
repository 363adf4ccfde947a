/** "Crème brûlée" is known as "creme-brulee": readable in an address, at most 36 characters. */
export const slug = (name: string): string =>
  name.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase().replace(/[^a-z0-9]+/g, '-').slice(0, 36).replace(/^-|-$/g, '');
