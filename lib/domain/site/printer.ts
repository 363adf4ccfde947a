import type { PrinterId, SharedPointId, TillId } from './ids';

export const connections = ['network', 'usb', 'serial', 'parallel'] as const;
export type Connection = (typeof connections)[number];
export const rollWidthsMm = [80, 76, 58] as const;
export type RollWidthMm = (typeof rollWidthsMm)[number];
export const codePages = ['cp437', 'cp850', 'cp852', 'cp858', 'cp866', 'windows-1252'] as const;
export type CodePage = (typeof codePages)[number];
/** How a printer makes an allergy stand out. */
export const emphases = ['inverse', 'red', 'frame'] as const;
export type Emphasis = (typeof emphases)[number];
export const printerStages = ['planned', 'addressed', 'reachable', 'tested', 'signed-off'] as const;
export type PrinterStage = (typeof printerStages)[number];

export type Printer = {
  readonly id: PrinterId;
  /** What every till knows it by. */
  readonly name: string;
  readonly model: string;
  readonly serial: string;
  readonly connection: Connection;
  /** The till it is plugged into, when it is not on the network. */
  readonly hostTill: TillId | null;
  readonly address: string;
  readonly mask: string;
  readonly gateway: string;
  readonly port: number;
  readonly mac: string;
  /** The address it answers on until it is given the one above; empty when done. */
  readonly presentAddress: string;
  readonly rollWidthMm: RollWidthMm;
  /** Characters in a line of font A. */
  readonly columns: number;
  readonly codePage: CodePage;
  readonly emphasis: Emphasis;
  readonly cutter: boolean;
  readonly buzzer: boolean;
  readonly backup: PrinterId | null;
  /** Stations that share it come out on one ticket. */
  readonly joinsStations: boolean;
  readonly sharedPoints: readonly SharedPointId[];
  readonly stage: PrinterStage;
  /** ISO 8601 UTC while it is down, else null. */
  readonly downSince: string | null;
  readonly downReason: string;
  /** Row version, for a refused stale write. */
  readonly version: number;
};
