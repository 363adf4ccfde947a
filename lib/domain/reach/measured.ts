import type { PrinterId, TillId } from '../site/ids';
import type { Site } from '../site/site';
import type { Answer, Reach } from './reach';

/** What is known of a pair by trying it; a printed test needs no word about answering. */
export type Measurement = { readonly strength: 'answered' | 'printed'; readonly reaches: boolean; readonly at: string };

type Measurements = ReadonlyMap<TillId, ReadonlyMap<PrinterId, Measurement>>;

/** A printed test stands until a later attempt gets no answer; of several answers the latest counts. */
const stronger = (held: Measurement | undefined, next: Measurement): Measurement => {
  if (held === undefined) return next;
  if (held.strength === next.strength) return next.at > held.at ? next : held;
  const [printed, answered] = held.strength === 'printed' ? [held, next] : [next, held];
  return !answered.reaches && answered.at > printed.at ? answered : printed;
};

export const measurementsOf = (site: Pick<Site, 'tills'>, answers: readonly Answer[]): Measurements => {
  const all = new Map<TillId, Map<PrinterId, Measurement>>();
  const add = (till: TillId, printer: PrinterId, next: Measurement): void => {
    const row = all.get(till) ?? new Map<PrinterId, Measurement>();
    row.set(printer, stronger(row.get(printer), next));
    all.set(till, row);
  };
  for (const answer of answers) add(answer.till, answer.printer, { strength: 'answered', reaches: answer.answers, at: answer.at });
  for (const till of site.tills) {
    for (const queue of till.queues) {
      if (queue.testPrintedAt !== null) add(till.id, queue.printer, { strength: 'printed', reaches: true, at: queue.testPrintedAt });
    }
  }
  return all;
};

const outcomeWords = (measured: Measurement, tillName: string, printerName: string): string => {
  if (measured.strength === 'printed') return `A test from ${tillName} printed on ${printerName}.`;
  return measured.reaches ? `${printerName} answered ${tillName}.` : `${printerName} did not answer ${tillName}.`;
};

/** The measurement with, where it disagrees, what working it out had said. */
export const measuredReach = (worked: Reach, measured: Measurement, tillName: string, printerName: string): Reach => {
  const outcome = outcomeWords(measured, tillName, printerName);
  return {
    ...worked,
    reaches: measured.reaches,
    strength: measured.strength,
    measuredAt: measured.at,
    why: measured.reaches === worked.reaches ? outcome : `${outcome} By its settings it should ${worked.reaches ? '' : 'not '}reach it: ${worked.why}`,
    broken: measured.reaches ? null : worked.broken,
  };
};
