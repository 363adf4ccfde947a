import type { TicketSheet } from './sheet';

const pageBreak = '\f';

/** The words alone, a row a line, pages parted by a form feed; double width counts once. */
export const sheetToText = (sheet: TicketSheet): string =>
  sheet.pages
    .map(({ rows }) => rows.map(({ runs }) => runs.map(({ text }) => text).join('').trimEnd()).join('\n'))
    .join(`\n${pageBreak}\n`);
