import type { TicketLine } from './ticket';

/** How many of a dish are for which seat. */
export type Portion = { readonly seat: number | null; readonly quantity: number };

/** Lines that differ only in seat and quantity, as one: "2 crab toast, seats 1, 3". */
export type Entry = Omit<TicketLine, 'seat' | 'quantity' | 'sourceLine'> & {
  readonly quantity: number;
  readonly portions: readonly Portion[];
  readonly sourceLines: readonly number[];
};

export const entryOf = ({ seat, quantity, sourceLine, ...rest }: TicketLine): Entry => ({
  ...rest, quantity, portions: [{ seat, quantity }], sourceLines: [sourceLine],
});

const likeness = ({ name, options, forDish, note, allergies, marks, stationCodes }: TicketLine): string =>
  JSON.stringify([name, options, forDish, note, allergies, marks, stationCodes]);

const addPortion = (portions: readonly Portion[], more: Portion): readonly Portion[] =>
  portions.some(({ seat }) => seat === more.seat)
    ? portions.map((portion) => (portion.seat === more.seat ? { ...portion, quantity: portion.quantity + more.quantity } : portion))
    : [...portions, more];

/** Where each first stood, it stays; a seat with an allergy never joins one without. */
export const mergeLines = (lines: readonly TicketLine[]): readonly Entry[] => {
  const entries = new Map<string, Entry>();
  for (const line of lines) {
    const key = likeness(line);
    const before = entries.get(key);
    entries.set(key, before === undefined ? entryOf(line) : {
      ...before,
      quantity: before.quantity + line.quantity,
      portions: addPortion(before.portions, line),
      sourceLines: [...before.sourceLines, line.sourceLine],
    });
  }
  return [...entries.values()];
};

const amount = (portion: Portion, told: boolean): string => (told ? ` (${portion.quantity})` : '');

/** "seat 2", "seats 1, 3", "seats 1 (2), 3 (1)", "table (1), seat 4 (1)". */
export const portionWords = (portions: readonly Portion[]): string => {
  const seats = portions.filter(({ seat }) => seat !== null).toSorted((left, right) => (left.seat ?? 0) - (right.seat ?? 0));
  const table = portions.find(({ seat }) => seat === null);
  const told = portions.length > 1 && (table !== undefined || seats.some(({ quantity }) => quantity > 1));
  const numbers = seats.map((portion) => `${portion.seat}${amount(portion, told)}`).join(', ');
  return [
    ...(table === undefined ? [] : [`table${amount(table, told)}`]),
    ...(seats.length === 0 ? [] : [`${seats.length === 1 ? 'seat' : 'seats'} ${numbers}`]),
  ].join(', ');
};
