import { pieceMaker } from '@/lib/domain/routing/pieces';
import { routeLine, type LineRoute } from '@/lib/domain/routing/route-line';
import type { Routing } from '@/lib/domain/routing/routing';
import type { OrderEvent } from './event';
import type { FollowUp } from './follow-up';
import type { OrderLine } from './order';
import { quantityLeft, type PrintedPart, type Tab, type TabLine } from './tab';
import { begin, nothing, partsOf, type Step, type Work } from './work';

/** Options chosen late are split by the rules of now; everything already decided stays. */
const withOptions = (routing: Routing, sent: LineRoute, line: OrderLine): LineRoute => {
  const now = routeLine(routing, line.item, line.options, sent.context);
  const kept = new Map(sent.splits.map((split) => [split.option, split]));
  return { ...sent, options: line.options, splits: line.options.flatMap((option) => kept.get(option) ?? now.splits.find((split) => split.option === option) ?? []) };
};

const samePart = (left: Omit<PrintedPart, 'printer'>, right: Omit<PrintedPart, 'printer'>): boolean =>
  left.kind === right.kind && left.option === right.option && left.station === right.station;

/** Parts of an amended line that have no paper yet: a new option that another station makes. */
const newParts = ({ kitchen }: Work, tab: Tab, index: number, sent: TabLine, route: LineRoute): FollowUp => {
  const made = pieceMaker(kitchen.site)(tab, sent.line, index, route, ['AMENDED'], quantityLeft(sent));
  const isNew = (option: unknown, kind: string): boolean => kind === 'split' && !sent.printed.some((part) => part.kind === 'split' && part.option === option);
  return { pieces: made.pieces.filter((piece) => isNew(piece.option, piece.kind)), losses: made.losses.filter((loss) => isNew(loss.option, loss.kind)) };
};

/**
 * A late allergy, a changed option or note: prints loudly on every printer that printed the line. A station whose option
 * was taken off gets it voided; one that has to make a new option gets its first paper.
 */
export const amend = (work: Work, event: Extract<OrderEvent, { kind: 'amend' }>): Step => {
  const { tab, routing, kitchen, print, follow } = work;
  const sent = tab.lines[event.line];
  if (sent === undefined || quantityLeft(sent) === 0) return [tab, nothing('This line is not on the order any more. Nothing printed.')];
  const line = { ...sent.line, options: event.options ?? sent.line.options, note: event.note ?? sent.line.note, allergies: event.allergies ?? sent.line.allergies };
  const route = sent.route === null ? null : withOptions(routing, sent.route, line);
  const still = (part: PrintedPart): boolean => part.option === null || line.options.includes(part.option);
  const put = (changed: TabLine): Tab => ({ ...tab, lines: tab.lines.map((one, index) => (index === event.line ? changed : one)) });
  const changed: TabLine = { ...sent, line, route, printed: sent.printed.filter(still) };
  const after = put(changed);
  const gone = follow([event.line], event.till, ['VOID'], { parts: (part) => !still(part) });
  const told = begin(kitchen, after).follow([event.line], event.till, ['AMENDED']);
  const fresh = route === null || sent.held ? { pieces: [], losses: [] } : newParts(work, after, event.line, changed, route);
  const printed = [...changed.printed, ...partsOf(fresh.pieces, event.line).filter((part) => !changed.printed.some((known) => samePart(known, part)))];
  const done = put({ ...changed, printed });
  return [done, print(done, event.till, { kind: 'amend', words: ['Amended'] }, {
    pieces: [...told.pieces, ...gone.pieces, ...fresh.pieces], losses: [...told.losses, ...gone.losses, ...fresh.losses],
  }, sent.sending)];
};
