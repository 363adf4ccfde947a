import type { Order } from '@/lib/domain/orders/order';
import type { TriedOrder } from '@/lib/domain/orders/try-order';
import type { Site } from '@/lib/domain/site/site';
import { counted, itemName, sentencesOf } from './words';

/** How many lines are refused, as impossible or by the plan. */
export const refusedLines = (tried: TriedOrder): number =>
  new Set([...tried.refusals.flatMap(({ line }) => line ?? []), ...tried.lines.filter(({ outcome }) => outcome === 'refused').map(({ line }) => line)]).size;

/** The outcome of the whole order in one sentence. */
export const headline = (tried: TriedOrder): { readonly tone: 'well' | 'look' | 'lost'; readonly words: string } => {
  const whole = tried.refusals.find(({ line }) => line === null);
  if (whole !== undefined) return { tone: 'look', words: 'This order cannot be sent' };
  const lost = tried.lines.filter(({ outcome }) => outcome === 'lost').length;
  const part = tried.lines.filter(({ outcome }) => outcome === 'part lost').length;
  if (lost > 0) return { tone: 'lost', words: `${counted(lost, 'line')} would print nowhere` };
  if (part > 0) return { tone: 'lost', words: `${counted(part, 'line')} would print only in part` };
  if (tried.tickets.some(({ unprintable }) => unprintable.some(({ allergy }) => allergy))) return { tone: 'lost', words: 'An allergy would not print as it was said' };
  if (tried.losses.length > 0) return { tone: 'look', words: 'A copy would print nowhere' };
  const refused = refusedLines(tried);
  const printers = new Set(tried.tickets.map(({ ticket }) => ticket.printer)).size;
  const paper = `${counted(tried.tickets.length, 'ticket')} from ${counted(printers, 'printer')}`;
  if (refused > 0) return { tone: 'look', words: `${counted(refused, 'line is', 'lines are')} refused${printers === 0 ? '' : `, the rest prints: ${paper}`}` };
  return { tone: 'well', words: printers === 0 ? 'Nothing prints for this order' : `Everything prints: ${paper}` };
};

/** Each dish, printer and character once, allergies first. */
export const unprintableWords = (tried: TriedOrder): readonly { readonly words: string; readonly allergy: boolean }[] => {
  const said = tried.tickets.flatMap(({ ticket, unprintable }) => unprintable.map(({ where, character, replacement, allergy }) => ({
    allergy, words: `${ticket.printerName} has no “${character}”: ${allergy ? 'the allergy' : ''} “${where}” would print with “${replacement}” instead.`.replace('  ', ' '),
  })));
  return [...new Map(said.map((one) => [one.words, one])).values()].toSorted((left, right) => Number(right.allergy) - Number(left.allergy));
};

export type BrokenLine = { readonly first: number; readonly name: string; readonly quantity: number; readonly reasons: readonly string[] };

/** Lost lines of the same item for the same reasons are one entry. */
export const brokenLines = (site: Site, order: Order, tried: TriedOrder): readonly BrokenLine[] => {
  const entries = new Map<string, BrokenLine>();
  for (const { line, outcome } of tried.lines) {
    const entry = order.lines[line];
    if (entry === undefined || (outcome !== 'lost' && outcome !== 'part lost')) continue;
    const reasons = sentencesOf(tried, line, site).filter(({ tone, step }) => tone === 'lost' && step !== 7).map(({ subject, rest }) => subject + rest);
    const name = itemName(site, entry);
    const key = JSON.stringify([name, reasons]);
    const before = entries.get(key);
    entries.set(key, { first: before?.first ?? line, name, reasons, quantity: (before?.quantity ?? 0) + entry.quantity });
  }
  return [...entries.values()];
};
