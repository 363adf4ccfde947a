import type { Plan } from './plan';
import type { Printer } from './printer';
import type { Station } from './station';
import type { Till } from './till';
import type { Menu } from './menu';
import type { AreaId, CourseId, SharedPointId, SiteId, TillId } from './ids';

/** A part of the room that orders come from. */
export type Area = { readonly id: AreaId; readonly name: string; readonly version: number };

export type Course = { readonly id: CourseId; readonly name: string };

export const sharedPointKinds = ['switch', 'access-point', 'power-strip', 'other'] as const;
export type SharedPointKind = (typeof sharedPointKinds)[number];

/** What several devices hang on: one loose plug there stops them all. */
export type SharedPoint = {
  readonly id: SharedPointId;
  readonly name: string;
  readonly kind: SharedPointKind;
};

export type Reservation = { readonly address: string; readonly reason: string };

export type Network = {
  /** CIDR, for example "10.20.30.0/24". Empty while nobody has said. */
  readonly subnet: string;
  readonly gateway: string;
  /** First and last address that the router hands out; both empty when it hands out none. */
  readonly poolFrom: string;
  readonly poolTo: string;
  readonly reserved: readonly Reservation[];
};

/** A site's own idea of a good printer name, within the hard limits of names/. */
export type NamingPolicy = {
  readonly minLength: number;
  readonly maxLength: number;
  readonly allowUnderscore: boolean;
  readonly allowHyphen: boolean;
  readonly mustStartWithLetter: boolean;
};

/** Where the print link runs: on a till, or on a device with an address and mask of its own. */
export type PrintLink =
  | { readonly kind: 'none' }
  | { readonly kind: 'till'; readonly till: TillId }
  | { readonly kind: 'own'; readonly address: string; readonly mask: string };

export const contactKinds = ['installer', 'network', 'electrician'] as const;
export type ContactKind = (typeof contactKinds)[number];
export type Contact = {
  readonly kind: ContactKind;
  readonly name: string;
  readonly phone: string;
  readonly email: string;
};

export const followModes = ['by-hand', 'asking', 'through-link'] as const;
/** How the tills follow a change of plan. */
export type FollowMode = (typeof followModes)[number];

/** The plan version that is live, and the tills that are known to be set to it. */
export type LivePlan = {
  readonly planId: Plan['id'];
  readonly version: number;
  /** ISO 8601, UTC. */
  readonly since: string;
  readonly inForceOn: readonly TillId[];
};

/** Everything Tamis knows of one restaurant at one address, as one readonly value. */
export type Site = {
  readonly id: SiteId;
  readonly name: string;
  /** The town or quarter, shown beside the name. */
  readonly place: string;
  /** IANA zone, for example "Europe/Dublin". */
  readonly timeZone: string;
  /** BCP 47. */
  readonly language: string;
  readonly network: Network;
  readonly namingPolicy: NamingPolicy;
  readonly follows: FollowMode;
  readonly link: PrintLink;
  readonly contacts: readonly Contact[];
  readonly courses: readonly Course[];
  readonly sharedPoints: readonly SharedPoint[];
  readonly areas: readonly Area[];
  readonly tills: readonly Till[];
  readonly printers: readonly Printer[];
  /** In order of position. */
  readonly stations: readonly Station[];
  readonly menu: Menu;
  readonly plans: readonly Plan[];
  readonly live: LivePlan | null;
  /** Version of the site's own settings. */
  readonly version: number;
};
