import type { CodePage, Connection, Emphasis, PrinterStage, RollWidthMm } from '../site/printer';

export const connectionWords: Readonly<Record<Connection, string>> = { network: 'Network', usb: 'USB', serial: 'Serial', parallel: 'Parallel' };

export const stageWords: Readonly<Record<PrinterStage, string>> = {
  planned: 'Planned', addressed: 'Addressed', reachable: 'Reachable', tested: 'Tested', 'signed-off': 'Signed off',
};

export const emphasisWords: Readonly<Record<Emphasis, string>> = {
  inverse: 'White on black', red: 'Red, on a two-colour ribbon or roll', frame: 'Frame and double width',
};

export const codePageWords: Readonly<Record<CodePage, string>> = {
  cp437: '437, United States', cp850: '850, Western Europe', cp852: '852, Central Europe', cp858: '858, Western Europe with €', cp866: '866, Cyrillic',
  'windows-1252': 'Windows 1252, Western Europe with €',
};

/** Characters of font A on one line at 203 dpi, the usual figure for each roll. */
export const usualColumns: Readonly<Record<RollWidthMm, number>> = { 80: 48, 76: 42, 58: 32 };
