import type { AreaId, PrinterId, SharedPointId, TillId } from './ids';
import type { OrderType } from './order-types';

export const tillKinds = ['fixed', 'handheld', 'online'] as const;
export type TillKind = (typeof tillKinds)[number];
export const tillSystems = ['windows', 'linux', 'other'] as const;
export type TillSystem = (typeof tillSystems)[number];
export const addressSources = ['static', 'dhcp', 'dhcp-reserved'] as const;
export type AddressSource = (typeof addressSources)[number];
export const portKinds = ['tcp', 'usb', 'parallel', 'shared'] as const;
export type PortKind = (typeof portKinds)[number];

/** One printer as it is installed on one till. */
export type Queue = {
  readonly printer: PrinterId;
  /** The name as typed on this till, letter for letter. */
  readonly typedName: string;
  readonly portKind: PortKind;
  /** "10.20.30.201:9100", "LPT1:", "\\\\BACKOFFICE\\GRILL1" ... as found. */
  readonly portAddress: string;
  /** ISO 8601 UTC, or null while no test has printed from this till. */
  readonly testPrintedAt: string | null;
};

/** A device that sends orders. */
export type Till = {
  readonly id: TillId;
  readonly name: string;
  readonly kind: TillKind;
  readonly area: AreaId;
  readonly orderTypes: readonly OrderType[];
  readonly system: TillSystem;
  readonly address: string;
  readonly mask: string;
  readonly addressSource: AddressSource;
  /** Name of the wired adapter, as the system shows it. */
  readonly adapter: string;
  readonly sharedPoints: readonly SharedPointId[];
  /** The printer that the till's system uses when none is named. */
  readonly defaultPrinter: PrinterId | null;
  readonly printsThrough: TillId | null;
  readonly queues: readonly Queue[];
  readonly version: number;
};
