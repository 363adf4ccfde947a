import type { CodePage } from '@/lib/domain/site/printer';
import { byteOf } from './code-pages';
import type { Row, Run, TicketSheet } from './sheet';
import type { PaperPrinter } from './ticket';

/** Common printer commands, as the public manuals of several makers give them; ESC is 1B, GS is 1D. */
const commands = {
  initialise: [0x1b, 0x40],
  codePage: (number: number) => [0x1b, 0x74, number],
  bold: (on: boolean) => [0x1b, 0x45, on ? 1 : 0],
  size: (width: 1 | 2, height: 1 | 2) => [0x1d, 0x21, ((width - 1) << 4) | (height - 1)],
  inverse: (on: boolean) => [0x1d, 0x42, on ? 1 : 0],
  red: (on: boolean) => [0x1b, 0x72, on ? 1 : 0],
  lineFeed: [0x0a],
  feedLines: (lines: number) => [0x1b, 0x64, lines],
  feedAndCut: [0x1d, 0x56, 0x42, 0x00],
  /** Through the drawer connector: 100 ms on, 400 ms off, in units of 2 ms. */
  buzz: [0x1b, 0x70, 0x00, 50, 200],
} as const;

/** The number by which most makers know each page; some differ, so a test print is owed. */
const codePageNumbers: Readonly<Record<CodePage, number>> = { cp437: 0, cp850: 2, 'windows-1252': 16, cp866: 17, cp852: 18, cp858: 19 };

/** From the print head to the tear bar, 18 mm, at 4.2 mm a line. */
const linesToTearBar = 5;

const unknownByte = 0x3f;

type Style = { readonly bold: boolean; readonly allergy: boolean; readonly width: 1 | 2; readonly height: 1 | 2 };
const plainStyle: Style = { bold: false, allergy: false, width: 1, height: 1 };

const styleOf = ({ emphasis, width, height }: Run): Style => ({ bold: emphasis !== 'none', allergy: emphasis === 'allergy', width, height });

const change = (from: Style, to: Style, emphasis: PaperPrinter['emphasis']): readonly number[] => [
  ...(from.bold === to.bold ? [] : commands.bold(to.bold)),
  ...(from.width === to.width && from.height === to.height ? [] : commands.size(to.width, to.height)),
  ...(from.allergy === to.allergy || emphasis === 'frame' ? [] : commands[emphasis](to.allergy)),
];

const encode = (text: string, codePage: CodePage): readonly number[] => Array.from(text, (character) => byteOf(character, codePage) ?? unknownByte);

const rowBytes = (row: Row, printer: PaperPrinter): readonly number[] => {
  const bytes: number[] = [];
  let style = plainStyle;
  for (const each of row.runs) {
    const next = styleOf(each);
    bytes.push(...change(style, next, printer.emphasis), ...encode(each.text, printer.codePage));
    style = next;
  }
  return [...bytes, ...change(style, plainStyle, printer.emphasis), ...commands.lineFeed];
};

/** What goes to the printer, all copies and pages of it, each cut off where the printer can cut. */
export const sheetToBytes = (sheet: TicketSheet, printer: PaperPrinter): Uint8Array => {
  const end = printer.cutter ? commands.feedAndCut : commands.feedLines(linesToTearBar);
  const once = sheet.pages.flatMap(({ rows }) => [...rows.flatMap((row) => rowBytes(row, printer)), ...end]);
  return Uint8Array.from([
    ...commands.initialise, ...commands.codePage(codePageNumbers[printer.codePage]), ...(printer.buzzer ? commands.buzz : []),
    ...Array.from({ length: sheet.times }, () => once).flat(),
  ]);
};
