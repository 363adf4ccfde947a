import type { CourseId, TillId } from '@/lib/domain/site/ids';
import type { OrderEvent } from './event';
import { quantityLeft, type Tab } from './tab';
import { begin, courseName, courseOf, indexesOf, nothing, type Step, type Work } from './work';

/** Takes units off: prints only where the line printed. A line not yet fired is known at the pass alone. */
export const voidLine = ({ tab, follow, print }: Work, event: Extract<OrderEvent, { kind: 'void' }>): Step => {
  const sent = tab.lines[event.line];
  if (sent === undefined || !Number.isInteger(event.quantity) || event.quantity < 1 || event.quantity > quantityLeft(sent)) {
    return [tab, nothing(`${sent === undefined ? 'This line is not on the order.' : `Only ${quantityLeft(sent)} can be taken off.`} Nothing printed.`)];
  }
  const after = { ...tab, lines: tab.lines.map((line, index) => (index === event.line ? { ...line, voided: line.voided + event.quantity } : line)) };
  return [after, print(after, event.till, { kind: 'void', words: ['Void'] }, follow([event.line], event.till, ['VOID'], { quantityOf: () => event.quantity }), sent.sending)];
};

/** To another table: sent and held lines keep their routing, later additions use the new area. */
export const move = ({ tab, kitchen, follow, print }: Work, event: Extract<OrderEvent, { kind: 'move' }>): Step => {
  const area = event.area ?? tab.area;
  if (!kitchen.site.areas.some((one) => one.id === area)) return [tab, nothing('This site has no such area. Nothing printed.')];
  const after = { ...tab, table: event.table, area };
  return [after, print(after, event.till, { kind: 'move', words: [`Moved from table ${tab.table}`] }, follow(indexesOf(tab, () => true), event.till, []))];
};

/** Another table's lines join this one, and their stations are told the new table. */
export const merge = (work: Work, event: Extract<OrderEvent, { kind: 'merge' }>): Step => {
  const { tab, kitchen, print } = work;
  const joined: Tab = { ...tab, lines: [...tab.lines, ...event.other.lines], allergies: [...tab.allergies, ...event.other.allergies], covers: tab.covers === null || event.other.covers === null ? null : tab.covers + event.other.covers };
  const theirs = indexesOf(joined, () => true).filter((index) => index >= tab.lines.length);
  return [joined, print(joined, event.till, { kind: 'merge', words: [`Table ${event.other.table} joins table ${tab.table}`] }, begin(kitchen, joined).follow(theirs, event.till, []))];
};

/** Asks for a course to be hurried, wherever it printed; a null course is all of it. */
export const rush = ({ kitchen, tab, print, follow }: Work, till: TillId, course: CourseId | null): Step => {
  const indexes = indexesOf(tab, (line) => !line.held && (course === null || courseOf(kitchen.site, line) === course));
  return [tab, print(tab, till, { kind: 'rush', words: [`Rush ${courseName(kitchen.site, course)}`] }, follow(indexes, till, ['RUSH']))];
};

/** The paper of one sending again, where it printed. */
export const reprint = ({ tab, print, follow }: Work, till: TillId, sending: number): Step => {
  const indexes = indexesOf(tab, (line) => line.sending === sending);
  return [tab, print(tab, till, { kind: 'reprint', words: ['Reprint'] }, follow(indexes, till, ['REPRINT']), sending)];
};
